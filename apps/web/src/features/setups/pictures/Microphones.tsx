import type { SetupFields } from '@thudline/contracts';
import { ink } from '../../sheet/pictures/ink';
import { halo, PictureText } from '../../sheet/pictures/PictureText';
import { setupDistances, usualKit } from '../setupGeometry';
import { beaterAt } from './Kit';
import { lookFromAbove, lookFromSide, type PointPx, type SetupLayout } from './setupLayout';

interface ViewProps {
  fields: Pick<SetupFields, 'kick' | 'overhead'>;
  layout: SetupLayout;
}

/** How far the stroke that shows where a microphone looks reaches out of its mark. */
const lookPx = 15;

export function MicrophonesFromAbove({ fields, layout }: ViewProps) {
  const beater = beaterAt(layout).above;
  const { kickMicrophone, overhead } = layout;
  const turnedDeg = fields.kick.turnedDeg;
  return (
    <>
      {overhead.above && <Way from={beater} to={overhead.above} color={ink.overhead} widthPx={2} />}
      {kickMicrophone.above && <Way from={beater} to={kickMicrophone.above} color={ink.kick} widthPx={3.2} />}
      {kickMicrophone.above && turnedDeg !== null && (
        <Way
          from={kickMicrophone.above}
          to={lookFromAbove(kickMicrophone.above, beater, turnedDeg, lookPx)}
          color={ink.kick}
          widthPx={5}
        />
      )}
      <Marks beater={beater} kick={kickMicrophone.above} overhead={overhead.above} />
    </>
  );
}

export function MicrophonesFromSide({
  fields,
  layout,
  lengthWords,
}: ViewProps & { lengthWords: (lengthCm: number) => string }) {
  const beater = beaterAt(layout).side;
  const { kickMicrophone, overhead } = layout;
  const { beaterToKickCm, beaterToOverheadCm } = setupDistances(fields);
  const { tiltedDeg, aboveSnareCm } = fields.overhead;
  return (
    <>
      {overhead.side && <Way from={beater} to={overhead.side} color={ink.overhead} widthPx={2} />}
      {kickMicrophone.side && <Way from={beater} to={kickMicrophone.side} color={ink.kick} widthPx={3.2} />}
      {overhead.side && tiltedDeg !== null && (
        <Way
          from={overhead.side}
          to={lookFromSide(overhead.side, tiltedDeg, lookPx)}
          color={ink.overhead}
          widthPx={4}
        />
      )}
      {overhead.side && aboveSnareCm !== null && (
        <HeightBracket {...{ layout, at: overhead.side }} words={lengthWords(aboveSnareCm)} />
      )}
      {fields.kick.insideCm !== null && (
        <DepthBracket layout={layout} insideCm={fields.kick.insideCm} lengthWords={lengthWords} />
      )}
      <Marks beater={beater} kick={kickMicrophone.side} overhead={overhead.side} />
      {overhead.side && beaterToOverheadCm !== null && (
        <PictureText
          x={(beater.x + overhead.side.x) / 2 - 12}
          y={beater.y + 0.72 * (overhead.side.y - beater.y)}
          textAnchor="end"
          fontSize={16}
          bold
          fill={ink.overhead}
          {...halo}
        >
          {lengthWords(beaterToOverheadCm)}
        </PictureText>
      )}
      {kickMicrophone.side && beaterToKickCm !== null && (
        <PictureText
          x={(beater.x + kickMicrophone.side.x) / 2}
          y={Math.min(beater.y, kickMicrophone.side.y) - 14}
          textAnchor="middle"
          fontSize={16}
          bold
          fill={ink.kick}
          {...halo}
        >
          {lengthWords(beaterToKickCm)}
        </PictureText>
      )}
    </>
  );
}

function Way({ from, to, color, widthPx }: { from: PointPx; to: PointPx; color: string; widthPx: number }) {
  return <path d={`M${from.x} ${from.y}L${to.x} ${to.y}`} stroke={color} strokeWidth={widthPx} fill="none" />;
}

function Marks({
  beater,
  kick,
  overhead,
}: {
  beater: PointPx;
  kick: PointPx | null;
  overhead: PointPx | null;
}) {
  return (
    <>
      <circle cx={beater.x} cy={beater.y} r="3" fill={ink.ink} />
      {kick && <circle cx={kick.x} cy={kick.y} r="6.5" fill={ink.kick} />}
      {overhead && (
        <circle
          cx={overhead.x}
          cy={overhead.y}
          r="6.5"
          fill={ink.sheet}
          stroke={ink.overhead}
          strokeWidth="2.6"
        />
      )}
    </>
  );
}

/** How far the overhead is above the snare, at the snare's back. */
function HeightBracket({ layout, at, words }: { layout: SetupLayout; at: PointPx; words: string }) {
  const { xOf, ySideOf } = layout;
  const snareY = ySideOf(usualKit.snare.upCm);
  const x = Math.max(60, Math.min(xOf(usualKit.snare.frontCm - 18), at.x) - 21);
  return (
    <g stroke={ink.ink} strokeWidth="1.5" fill="none">
      <path d={`M${x} ${at.y}V${snareY}M${x - 5} ${at.y}h10M${x - 5} ${snareY}h10`} />
      <path d={`M${x + 8} ${at.y}H${at.x - 9}`} stroke={ink.rule} strokeWidth="1" />
      <PictureText
        x={x - 9}
        y={(at.y + snareY) / 2 + 5}
        textAnchor="end"
        fontSize={15}
        bold
        fill={ink.ink}
        stroke="none"
      >
        {words}
      </PictureText>
    </g>
  );
}

/** How far the kick microphone is behind the front head, or before it. */
function DepthBracket({
  layout,
  insideCm,
  lengthWords,
}: {
  layout: SetupLayout;
  insideCm: number;
  lengthWords: (lengthCm: number) => string;
}) {
  const { xOf, ySideOf } = layout;
  const headX = xOf(usualKit.kickDepthCm);
  const atX = xOf(usualKit.kickDepthCm - insideCm);
  const y = ySideOf(7);
  const rightX = Math.max(headX, atX);
  return (
    <g stroke={ink.ink} strokeWidth="1.5" fill="none">
      <path d={`M${atX} ${y}H${Math.max(headX, atX) + (insideCm >= 0 ? 12 : 0)}M${atX} ${y - 5}v10`} />
      {insideCm < 0 && <path d={`M${headX} ${y}H${atX}M${headX} ${y - 5}v10`} />}
      <PictureText x={rightX + 17} y={y + 5} fontSize={15} bold fill={ink.ink} stroke="none">
        {lengthWords(Math.abs(insideCm))}
      </PictureText>
    </g>
  );
}
