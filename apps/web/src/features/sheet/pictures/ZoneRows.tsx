import { Box } from '@chakra-ui/react';
import type { ZoneLevel } from '@thudline/dsp';
import { signed } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { ink } from './ink';
import { halo, PictureText } from './PictureText';
import type { Beside } from './WhereItHelps';

export type Zone = Beside<ZoneLevel>;

const rowPx = 34;
const topPx = 26;
const limitDb = 3.0103;

/** One row a zone: as recorded (ring) to chosen (disc). The low rows are what the verdict counts. */
export function ZoneRows({ zones, label }: { zones: Zone[]; label: string }) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(330);
  const left = Math.max(104, widthPx * 0.36);
  const right = widthPx - 10;
  // Deeper than −3 dB is possible; such a mark stands at the edge with its number in the text alternative.
  const x = (db: number) =>
    left + ((Math.min(limitDb, Math.max(-limitDb, db)) + limitDb) / (2 * limitDb)) * (right - left);
  const height = topPx + zones.length * rowPx + 28;
  const lowRows = zones.filter((zone) => zone.highHz <= 160).length;
  return (
    <Box ref={ref} minWidth={0}>
      <svg
        width={widthPx}
        height={height}
        role="img"
        aria-label={describe(zones, label)}
        style={{ display: 'block' }}
      >
        <PictureText x={x(0) - 8} y={13} textAnchor="end" fill={ink.muted}>
          pull apart
        </PictureText>
        <PictureText x={x(0) + 8} y={13} fill={ink.muted}>
          add up
        </PictureText>
        <rect x={0} y={topPx - 7} width={widthPx} height={lowRows * rowPx + 1} fill={ink.target} />
        {zones.map((zone, i) => (
          <ZoneRow key={zone.name} zone={zone} y={topPx + i * rowPx + 9} left={left} right={right} x={x} />
        ))}
        <path
          d={`M${x(0)} ${topPx - 10}V${topPx + zones.length * rowPx - 4}`}
          stroke={ink.ink}
          strokeWidth="1.4"
        />
        {([-3, 0, 3] as const).map((db) => (
          <PictureText
            key={db}
            x={db === 3 ? right : x(db)}
            y={height - 6}
            textAnchor={db === 3 ? 'end' : 'middle'}
            fill={ink.muted}
          >
            {db === 3 ? '+3 dB' : signed(db, 0)}
          </PictureText>
        ))}
      </svg>
    </Box>
  );
}

/** The third-octaves each zone is made of. */
const ranges: Record<Zone['name'], string> = {
  deep: '25–50 Hz',
  thump: '63–125 Hz',
  body: '160–500 Hz',
  knock: '0.63–2 kHz',
  click: '2.5–10 kHz',
};

function ZoneRow({
  zone,
  y,
  left,
  right,
  x,
}: {
  zone: Zone;
  y: number;
  left: number;
  right: number;
  x: (db: number) => number;
}) {
  const from = x(zone.recordedDb);
  const to = x(zone.levelDb);
  const way = Math.sign(to - from);
  return (
    <>
      <PictureText x={6} y={y} fontSize={15} bold fill={ink.ink}>
        {zone.name}
      </PictureText>
      <PictureText x={6} y={y + 14} fill={ink.muted}>
        {ranges[zone.name]}
      </PictureText>
      <path d={`M${left} ${y}H${right}`} stroke={ink.rule} strokeWidth="1.4" />
      {Math.abs(to - from) > 11 && (
        <path
          d={`M${from} ${y}H${to - 5 * way}m${-6 * way}-5l${6 * way} 5l${-6 * way} 5`}
          fill="none"
          stroke={ink.ink}
          strokeWidth="1.7"
        />
      )}
      <circle cx={from} cy={y} r={4.6} fill={ink.sheet} stroke={ink.ink} strokeWidth="1.8" />
      <circle cx={to} cy={y} r={5.2} fill={ink.ink} />
      {zone.levelDb < -limitDb && <OffAxis x={to} y={y} levelDb={zone.levelDb} />}
    </>
  );
}

/** The mark stands at the end of the axis; its level lies further out. */
function OffAxis({ x, y, levelDb }: { x: number; y: number; levelDb: number }) {
  return (
    <>
      <path d={`M${x - 9} ${y}l6-4v8z`} fill={ink.ink} />
      <PictureText x={x + 9} y={y - 5} fill={ink.muted} {...halo}>
        {signed(levelDb)}
      </PictureText>
    </>
  );
}

function describe(zones: Zone[], label: string): string {
  const rows = zones.map((zone) => `${zone.name} ${signed(zone.recordedDb)} to ${signed(zone.levelDb)} dB`);
  return `Where it helps, as recorded to ${label}: ${rows.join('; ')}.`;
}
