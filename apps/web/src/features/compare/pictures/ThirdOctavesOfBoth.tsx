import { Box } from '@chakra-ui/react';
import { signed } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';
import { bandPath, largestMove, limitDb, type BandPair } from './thirdOctavesLayout';

const box = { top: 10, height: 160, left: 34, right: 6 };
const labelled = ['31.5', '63', '125', '250', '500', '1k', '2k', '4k', '8k'];
const onPhone = ['31.5', '125', '500', '2k', '8k'];

/** Third-octaves of the two added, both takes in one picture: rings before, discs after. */
export function ThirdOctavesOfBoth({
  bands,
  names,
}: {
  bands: BandPair[];
  names: readonly [string, string];
}) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const stepPx = (widthPx - box.left - box.right) / bands.length;
  const x = (i: number) => box.left + (i + 0.5) * stepPx;
  const middle = box.top + box.height / 2;
  const y = (db: number) => middle - (Math.min(limitDb, Math.max(-limitDb, db)) / limitDb) * (box.height / 2);
  const lowCount = bands.filter(({ centreHz }) => centreHz < 150).length;
  const shown = widthPx < 480 ? onPhone : labelled;
  return (
    <Box ref={ref} marginTop="10px">
      <svg
        width={widthPx}
        height={box.top + box.height + 30}
        role="img"
        aria-label={describe(bands, names)}
        style={{ display: 'block' }}
      >
        <rect x={box.left} y={box.top} width={lowCount * stepPx} height={box.height} fill={ink.target} />
        <path d={`M${box.left} ${middle}H${widthPx}`} stroke={ink.edge} strokeWidth="1.2" />
        <path
          d={bandPath(
            bands.map(({ beforeDb }) => beforeDb),
            { x, y },
          )}
          fill="none"
          stroke={ink.ink}
          strokeWidth="1.4"
          strokeDasharray="1.5 4"
          strokeLinecap="round"
        />
        <path
          d={bandPath(
            bands.map(({ afterDb }) => afterDb),
            { x, y },
          )}
          fill="none"
          stroke={ink.ink}
          strokeWidth="2"
          strokeLinejoin="round"
        />
        {bands.map(
          ({ nominal, beforeDb }, i) =>
            beforeDb !== null && (
              <circle
                key={nominal}
                cx={x(i)}
                cy={y(beforeDb)}
                r="3.4"
                fill={ink.sheet}
                stroke={ink.ink}
                strokeWidth="1.6"
              />
            ),
        )}
        {bands.map(
          ({ nominal, afterDb }, i) =>
            afterDb !== null && <circle key={nominal} cx={x(i)} cy={y(afterDb)} r="3.6" fill={ink.ink} />,
        )}
        {[3, 0, -3].map((db) => (
          <PictureText key={db} x={box.left - 8} y={y(db) + 5} textAnchor="end" fill={ink.muted}>
            {signed(db, 0)}
          </PictureText>
        ))}
        {bands.map(({ nominal }, i) =>
          shown.includes(nominal) ? (
            <PictureText
              key={nominal}
              x={x(i)}
              y={box.top + box.height + 20}
              textAnchor="middle"
              fill={ink.muted}
            >
              {nominal}
              {nominal === shown.at(-1) ? ' Hz' : ''}
            </PictureText>
          ) : null,
        )}
      </svg>
    </Box>
  );
}

function describe(bands: BandPair[], [before, after]: readonly [string, string]): string {
  const move = largestMove(bands);
  const most = move
    ? `from ${before} to ${after} ${move.nominal} Hz moved most, by ${signed(move.byDb)} dB`
    : 'the takes have no band in common';
  return `Third-octaves of the two added, dB against no help and no harm: ${most}.`;
}
