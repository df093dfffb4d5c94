import { Box } from '@chakra-ui/react';
import { useId } from 'react';
import { decibels, signed, signedDecibels } from '../../../lib/format';
import { useWidth } from '../../../lib/useWidth';
import { balanceAxisDb, balanceTicksDb, cymbalsLoudFromDb } from './balanceLineLayout';
import { Hatch } from './Hatch';
import { ink } from './ink';
import { halo, PictureText } from './PictureText';

const lineY = 56;
const ticksY = 88;
/** Closer than this the two marks leave no room for a line between them. */
const apartPx = 24;
/** Of "cymbals" at 15 px, and of a difference. */
const wordPx = 74;
const numberPx = 76;

/** Drums (dot) and cymbals (ring) on one dB axis counted from the drums; hatched where cymbals are too loud to mend. */
export function BalanceLine({ differenceDb }: { differenceDb: number }) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const hatchId = useId();
  const axis = balanceAxisDb(differenceDb);
  const left = 34;
  const right = widthPx - 34;
  const x = (db: number) => left + ((db - axis.min) / (axis.max - axis.min)) * (right - left);
  return (
    <Box ref={ref} marginTop="14px">
      <svg
        width={widthPx}
        height={ticksY + 8}
        role="img"
        aria-label={describe(differenceDb)}
        style={{ display: 'block' }}
      >
        <defs>
          <Hatch id={hatchId} color={ink.hatch} gapPx={6} />
        </defs>
        <rect
          x={x(cymbalsLoudFromDb)}
          y={lineY - 7}
          width={right - x(cymbalsLoudFromDb)}
          height={14}
          fill={`url(#${hatchId})`}
        />
        <PictureText x={widthPx} y={14} textAnchor="end" fill={ink.muted}>
          too loud to mend later
        </PictureText>
        <path d={`M${left} ${lineY}H${right}`} stroke={ink.edge} strokeWidth="1.4" />
        {balanceTicksDb(axis, widthPx).map((tick) => (
          <g key={tick}>
            <path d={`M${x(tick)} ${lineY + 4}v8`} stroke={ink.edge} strokeWidth="1.2" />
            <PictureText x={x(tick)} y={ticksY} textAnchor="middle" fill={ink.muted}>
              {signed(tick, 0)}
              {tick === 0 || widthPx >= 480 ? ' dB' : ''}
            </PictureText>
          </g>
        ))}
        <Marks drumsX={x(0)} cymbalsX={x(differenceDb)} {...{ differenceDb, widthPx }} />
      </svg>
    </Box>
  );
}

interface MarksProps {
  drumsX: number;
  cymbalsX: number;
  differenceDb: number;
  widthPx: number;
}

function Marks({ drumsX, cymbalsX, differenceDb, widthPx }: MarksProps) {
  const way = cymbalsX >= drumsX ? 1 : -1;
  const anchor = (side: number) => (side < 0 ? 'end' : 'start');
  const cymbalsTextX = way > 0 ? Math.min(cymbalsX + 6, widthPx - wordPx) : Math.max(cymbalsX - 6, wordPx);
  return (
    <>
      {Math.abs(cymbalsX - drumsX) > apartPx && (
        <path d={`M${drumsX} ${lineY}H${cymbalsX - 7 * way}`} stroke={ink.overhead} strokeWidth="2.4" />
      )}
      {Math.abs(cymbalsX - drumsX) > numberPx && (
        <PictureText
          x={(drumsX + cymbalsX) / 2}
          y={lineY - 11}
          textAnchor="middle"
          bold
          fill={ink.ink}
          {...halo}
        >
          {signedDecibels(differenceDb)}
        </PictureText>
      )}
      <circle cx={drumsX} cy={lineY} r={7} fill={ink.overhead} />
      <circle cx={cymbalsX} cy={lineY} r={6.4} fill={ink.sheet} stroke={ink.overhead} strokeWidth="2.2" />
      <PictureText
        x={drumsX - 6 * way}
        y={lineY - 16}
        textAnchor={anchor(-way)}
        fontSize={15}
        bold
        fill={ink.overhead}
        {...halo}
      >
        drums
      </PictureText>
      <PictureText
        x={cymbalsTextX}
        y={lineY - 16}
        textAnchor={anchor(way)}
        fontSize={15}
        bold
        fill={ink.overhead}
        {...halo}
      >
        cymbals
      </PictureText>
    </>
  );
}

function describe(differenceDb: number): string {
  const alike = Math.abs(differenceDb) < 0.05;
  const how = alike
    ? 'as loud as'
    : `${decibels(Math.abs(differenceDb))} ${differenceDb > 0 ? 'louder' : 'quieter'} than`;
  return `In the overhead, cymbals are ${how} drums. Above ${signedDecibels(cymbalsLoudFromDb, 0)} no fader mends it later.`;
}
