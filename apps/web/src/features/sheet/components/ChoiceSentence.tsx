import { Box, chakra } from '@chakra-ui/react';
import { speedOfSoundMPerS } from '@thudline/dsp';
import { useState } from 'react';
import { InlineNumber } from '../../../components/InlineNumber';
import { InlineSelect } from '../../../components/InlineSelect';
import { TextButton } from '../../../components/Button';
import type { Bench } from '../hooks/useChoice';

const shiftUnits = ['ms', 'samples', 'cm', 'in'] as const;
type ShiftUnit = (typeof shiftUnits)[number];

/** How many of a unit one millisecond is. */
function perMs(
  unit: ShiftUnit,
  { sampleRateHz, temperatureC }: { sampleRateHz: number; temperatureC: number },
): number {
  const metresPerMs = speedOfSoundMPerS(temperatureC) / 1000;
  return { ms: 1, samples: sampleRateHz / 1000, cm: metresPerMs * 100, in: metresPerMs / 0.0254 }[unit];
}

const digits: Record<ShiftUnit, number> = { ms: 2, samples: 0, cm: 1, in: 1 };
const steps: Record<ShiftUnit, number> = { ms: 0.1, samples: 1, cm: 1, in: 0.5 };
/** More than any two microphones at one kit are apart. */
const shiftLimitMs = 20;

/** "Overhead **flipped**, **1.6 ms** earlier, **5.7 dB** louder": each part can be changed, and everything follows. */
export function ChoiceSentence({
  bench,
  sampleRateHz,
  temperatureC,
}: {
  bench: Bench;
  sampleRateHz: number;
  temperatureC: number;
}) {
  const [unit, setUnit] = useState<ShiftUnit>('ms');
  const { chosen, set, matchGainDb } = bench;
  const scale = perMs(unit, { sampleRateHz, temperatureC });
  return (
    <Box marginTop="12px" lineHeight="34px" _print={{ display: 'none' }}>
      Overhead{' '}
      <InlineSelect
        label="Polarity of the overhead"
        value={chosen.flipped ? 'flipped' : 'not flipped'}
        options={['flipped', 'not flipped']}
        onChange={(word) => set({ flipped: word === 'flipped' })}
      />
      ,{' '}
      <InlineNumber
        label={`Overhead earlier, ${unit}`}
        value={chosen.shiftMs * scale}
        digits={digits[unit]}
        step={steps[unit]}
        min={-shiftLimitMs * scale}
        max={shiftLimitMs * scale}
        onChange={(shift) => set({ shiftMs: shift / scale })}
      />{' '}
      <InlineSelect label="Unit of the shift" value={unit} options={shiftUnits} onChange={setUnit} /> earlier,{' '}
      <InlineNumber
        label="Overhead louder, dB"
        value={chosen.gainDb}
        digits={1}
        step={0.5}
        min={-40}
        max={60}
        onChange={(gainDb) => set({ gainDb })}
      />{' '}
      dB louder.{' '}
      <chakra.span fontSize="caption" color="ink.muted" whiteSpace="nowrap">
        <GainLink bench={bench} gainDb={matchGainDb}>
          levels matched
        </GainLink>
        {' · '}
        <GainLink bench={bench} gainDb={0}>
          levels as recorded
        </GainLink>
      </chakra.span>
    </Box>
  );
}

/** Says which balance stands, or leads to it. */
function GainLink({ bench, gainDb, children }: { bench: Bench; gainDb: number; children: string }) {
  const here = Math.abs(bench.chosen.gainDb - gainDb) < 0.05;
  if (here) return <chakra.b color="ink">{children}</chakra.b>;
  return <TextButton onClick={() => bench.set({ gainDb })}>{children}</TextButton>;
}
