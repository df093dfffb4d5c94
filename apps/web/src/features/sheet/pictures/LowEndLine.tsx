import { Box } from '@chakra-ui/react';
import { useId } from 'react';
import { signedDecibels } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { Hatch } from './Hatch';
import { ink } from './ink';
import { halo, PictureText } from './PictureText';
import { arcPath, axisDb, placeTicks, type LineTick } from './lowEndLineLayout';

const lineY = 57;

/** As recorded (ring) to chosen (disc) between pulling apart and adding fully; the other choices as ticks. */
export function LowEndLine({
  recordedDb,
  recordedLabel = 'as recorded',
  chosen,
  others,
}: {
  recordedDb: number;
  /** Of the ring. */
  recordedLabel?: string;
  chosen: LineTick;
  others: LineTick[];
}) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const hatchId = useId();
  const left = 6;
  const right = widthPx - 6;
  const x = (db: number) => {
    const inside = Math.min(axisDb.max, Math.max(axisDb.min, db));
    return left + ((inside - axisDb.min) / (axisDb.max - axisDb.min)) * (right - left);
  };
  const ticks = placeTicks(others, x, widthPx);
  const rows = Math.max(0, ...ticks.map((tick) => tick.row));
  const endsY = 97 + rows * 16;
  const narrow = widthPx < 480;
  return (
    <Box ref={ref}>
      <svg
        width={widthPx}
        height={endsY + 8}
        role="img"
        aria-label={describe({ recordedDb, recordedLabel, chosen })}
        style={{ display: 'block' }}
      >
        <defs>
          <Hatch id={hatchId} color={ink.hatch} gapPx={6} />
        </defs>
        <rect x={left} y={lineY - 3.5} width={x(0) - left} height={7} fill={`url(#${hatchId})`} />
        <rect x={x(0)} y={lineY - 3.5} width={right - x(0)} height={7} fill={ink.together} />
        <path d={`M${x(0)} ${lineY - 15}v30`} stroke={ink.ink} strokeWidth="1.6" />
        {ticks.map((tick) => (
          <path
            key={tick.label}
            d={`M${tick.x} ${lineY - 7}v${28 + tick.row * 16}`}
            stroke={ink.ink}
            strokeWidth="1.6"
          />
        ))}
        {ticks.map((tick) => (
          <PictureText
            key={tick.label}
            x={tick.x + (tick.side === 'left' ? -5 : 5)}
            y={lineY + 23 + tick.row * 16}
            textAnchor={tick.side === 'left' ? 'end' : 'start'}
            fill={ink.muted}
            {...halo}
          >
            {tick.label}
          </PictureText>
        ))}
        <EndPoints
          {...{
            recordedX: x(recordedDb),
            chosenX: x(chosen.levelDb),
            recordedDb,
            recordedLabel,
            chosen,
            widthPx,
          }}
        />
        <PictureText x={left} y={endsY} fill={ink.muted}>
          {narrow ? 'apart −3 dB' : 'pull apart −3 dB'}
        </PictureText>
        <PictureText x={x(0)} y={endsY} fill={ink.muted} textAnchor="middle">
          {narrow ? '0' : '0 = no help, no harm'}
        </PictureText>
        <PictureText x={right} y={endsY} fill={ink.muted} textAnchor="end">
          add fully +3 dB
        </PictureText>
      </svg>
    </Box>
  );
}

interface EndPointsProps {
  recordedX: number;
  chosenX: number;
  recordedDb: number;
  recordedLabel: string;
  chosen: LineTick;
  widthPx: number;
}

function EndPoints({ recordedX, chosenX, recordedDb, recordedLabel, chosen, widthPx }: EndPointsProps) {
  const moved = Math.abs(chosenX - recordedX) > 16;
  const outward = chosenX >= recordedX ? 1 : -1;
  const fits = (x: number, way: number, text: string) =>
    way < 0 ? x - text.length * 7.2 > 0 : x + text.length * 7.2 < widthPx;
  const label = (x: number, way: number, text: string) => {
    const side = fits(x, way, text) ? way : -way;
    return (
      <PictureText
        x={x + 15 * side}
        y={lineY - 13}
        textAnchor={side < 0 ? 'end' : 'start'}
        bold
        fill={ink.ink}
      >
        {text}
      </PictureText>
    );
  };
  return (
    <>
      {moved && (
        <>
          <path d={arcPath(recordedX, chosenX, lineY)} fill="none" stroke={ink.ink} strokeWidth="1.8" />
          <path
            d={`M${chosenX - 7} ${lineY - 19}l7 8l6-8.5`}
            fill="none"
            stroke={ink.ink}
            strokeWidth="1.8"
          />
          <PictureText
            x={(recordedX + chosenX) / 2}
            y={14}
            textAnchor="middle"
            fontSize={15}
            bold
            fill={ink.ink}
          >
            {signedDecibels(chosen.levelDb - recordedDb)}
          </PictureText>
        </>
      )}
      <circle cx={recordedX} cy={lineY} r={7} fill={ink.sheet} stroke={ink.ink} strokeWidth="2.2" />
      {label(recordedX, -outward, withLevelOffAxis(recordedLabel, recordedDb))}
      {chosen.label !== recordedLabel && (
        <>
          <circle cx={chosenX} cy={lineY} r={moved ? 8 : 4} fill={ink.ink} />
          {label(chosenX, outward, withLevelOffAxis(chosen.label, chosen.levelDb))}
        </>
      )}
    </>
  );
}

/** A mark that stands at the end of the axis because it lies beyond says where it is. */
const withLevelOffAxis = (label: string, levelDb: number) =>
  levelDb < axisDb.min ? `${label}, ${signedDecibels(levelDb)}` : label;

function describe({
  recordedDb,
  recordedLabel,
  chosen,
}: Pick<EndPointsProps, 'recordedDb' | 'recordedLabel' | 'chosen'>): string {
  return (
    `Low end of the two added, against no help and no harm: ${recordedLabel} ${signedDecibels(recordedDb)}; ` +
    `${chosen.label} ${signedDecibels(chosen.levelDb)}, a difference of ${signedDecibels(chosen.levelDb - recordedDb)}.`
  );
}
