import { Box } from '@chakra-ui/react';
import type { ThirdOctaveLevel } from '@thudline/dsp';
import { useId } from 'react';
import { signed } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { Hatch } from './Hatch';
import { ink } from './ink';
import { PictureText } from './PictureText';
import type { Beside } from './WhereItHelps';

export type Step = Beside<ThirdOctaveLevel>;

const box = { top: 26, height: 163, left: 34 };
const limitDb = 3.0103;
const labelled = ['31.5', '100', '315', '1k', '3.15k', '10k'];

/** Third-octave steps of the two added against their power sum: chosen filled, as recorded dotted. */
export function ThirdOctaveSteps({ steps, label }: { steps: Step[]; label: string }) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(332);
  const hatchId = useId();
  const stepPx = (widthPx - box.left) / steps.length;
  const x = (i: number) => box.left + i * stepPx;
  const middle = box.top + box.height / 2;
  const y = (db: number) => middle - (Math.min(limitDb, Math.max(-limitDb, db)) / limitDb) * (box.height / 2);
  const lowCount = steps.filter((step) => step.centreHz < 150).length;
  const outline = (of: (step: Step) => number) =>
    steps.map((step, i) => `${i === 0 ? 'M' : 'L'}${x(i)} ${y(of(step))}H${x(i + 1)}`).join('');
  return (
    <Box ref={ref} minWidth={0}>
      <svg
        width={widthPx}
        height={box.top + box.height + 34}
        role="img"
        aria-label={describe(steps, label)}
        style={{ display: 'block' }}
      >
        <defs>
          <Hatch id={hatchId} color={ink.hatch} />
        </defs>
        <PictureText x={box.left} y={13} fill={ink.muted}>
          third-octaves: {label === 'as recorded' ? 'as recorded' : `${label} (filled), as recorded (dotted)`}
        </PictureText>
        <rect
          x={box.left}
          y={box.top - 6}
          width={lowCount * stepPx}
          height={box.height + 8}
          fill={ink.target}
        />
        {steps.map((step, i) => {
          const top = Math.min(y(step.levelDb), middle);
          const fill = step.levelDb >= 0 ? ink.together : `url(#${hatchId})`;
          return (
            <rect
              key={step.centreHz}
              x={x(i)}
              y={top}
              width={stepPx}
              height={Math.abs(y(step.levelDb) - middle)}
              fill={fill}
            />
          );
        })}
        <path d={`M${box.left} ${middle}H${widthPx}`} stroke={ink.ink} strokeWidth="1.4" />
        <path
          d={outline((step) => step.recordedDb)}
          fill="none"
          stroke={ink.ink}
          strokeWidth="1.4"
          strokeDasharray="1.5 3.5"
          strokeLinecap="round"
        />
        <path d={outline((step) => step.levelDb)} fill="none" stroke={ink.ink} strokeWidth="2" />
        {steps.map(
          (step, i) =>
            step.levelDb < -limitDb && (
              <path key={step.nominal} d={`M${x(i + 0.5)} ${y(-limitDb) + 7}l-4-6h8z`} fill={ink.ink} />
            ),
        )}
        {[3, 0, -3].map((db) => (
          <PictureText key={db} x={box.left - 8} y={y(db) + 5} textAnchor="end" fill={ink.muted}>
            {signed(db, 0)}
          </PictureText>
        ))}
        {steps.map((step, i) =>
          labelled.includes(step.nominal) ? (
            <PictureText
              key={step.nominal}
              x={step.nominal === '10k' ? widthPx : x(i + 0.5)}
              y={box.top + box.height + 22}
              textAnchor={step.nominal === '10k' ? 'end' : 'middle'}
              fill={ink.muted}
            >
              {step.nominal}
              {step.nominal === '10k' ? ' Hz' : ''}
            </PictureText>
          ) : null,
        )}
      </svg>
    </Box>
  );
}

function describe(steps: Step[], label: string): string {
  const worst = steps.reduce((low, step) => (step.levelDb < low.levelDb ? step : low));
  return `Third-octaves of the two added, ${label}: the deepest is ${worst.nominal} Hz at ${signed(worst.levelDb)} dB.`;
}
