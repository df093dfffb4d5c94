import { Box, chakra } from '@chakra-ui/react';
import {
  choiceLowEnd,
  deepestThirdOctave,
  sumPeakDbfs,
  thirdOctaves,
  type Choice,
  type PairSpectrum,
} from '@thudline/dsp';
import { useMemo } from 'react';
import { dbfs, signedDecibels } from '../../../lib/format';
import type { Excerpt } from '../hooks/useExcerpt';

/** What the choice does in figures: the low end, the third-octave that loses most, and how high the two added peak. */
export function ChoiceFigures({
  spectrum,
  asRecorded,
  chosen,
  excerpt,
}: {
  spectrum: PairSpectrum;
  asRecorded: Choice;
  chosen: Choice & { label: string };
  excerpt: Excerpt | undefined;
}) {
  const peakDbfs = useMemo(
    () => (excerpt ? sumPeakDbfs(excerpt.kick, excerpt.overhead, { ...excerpt, choice: chosen }) : null),
    [excerpt, chosen],
  );
  const now = deepestThirdOctave(spectrum, chosen);
  const before = deepestThirdOctave(spectrum, asRecorded);
  const lowEndDb = choiceLowEnd(spectrum, chosen);
  if (!now || !before || lowEndDb === null) return null;
  const same = chosen.label === 'as recorded';
  return (
    <Box fontSize="small" color="ink.muted" marginTop="12px">
      Low end of the two added, {chosen.label}:{' '}
      <b data-low-end-db={lowEndDb.toFixed(4)}>{signedDecibels(lowEndDb, 2)}</b>. Deepest third-octave:{' '}
      {bandWords(now)}
      {same ? '' : `; as recorded ${bandWords(before)}`}.{' '}
      {peakDbfs !== null && <PeakWords peakDbfs={peakDbfs} />}
    </Box>
  );
}

function bandWords({ centreHz, levelDb }: { centreHz: number; levelDb: number }): string {
  const band = thirdOctaves.find((each) => Math.abs(each.centreHz / centreHz - 1) < 0.01);
  return `${band?.nominal ?? Math.round(centreHz)} Hz, ${signedDecibels(levelDb)}`;
}

/** The two added may clip though neither does. */
function PeakWords({ peakDbfs }: { peakDbfs: number }) {
  if (peakDbfs <= 0) return <>At this hit the two added peak at {dbfs(peakDbfs)}.</>;
  return (
    <chakra.span color="watch">
      At this hit the two added peak {signedDecibels(peakDbfs)} over full scale: turn both down before adding
      them.
    </chakra.span>
  );
}
