import type { KickPlace, OverheadPlace } from '@thudline/contracts';
import { kickMicrophoneAt, overheadAt, usualKit, type PlaceCm } from '../setupGeometry';

export interface PointPx {
  x: number;
  y: number;
}

interface DrumCm {
  name: string;
  frontCm: number;
  rightCm: number;
  radiusCm: number;
  /** Drums are drawn with a heavier line than cymbals. */
  isDrum: boolean;
  /** Where a cymbal hangs, for the view from the side. */
  cymbalUpCm?: number;
}

/** The rest of the usual kit, to stand around what is measured; common practice, no source. */
export const kitAround: readonly DrumCm[] = [
  { name: 'snare', ...usualKit.snare, radiusCm: 18, isDrum: true },
  { name: 'tom', frontCm: 13, rightCm: -6, radiusCm: 14, isDrum: true },
  { name: 'floor tom', frontCm: -30, rightCm: 42, radiusCm: 20, isDrum: true },
  { name: 'hat', frontCm: -14, rightCm: -56, radiusCm: 18, isDrum: false, cymbalUpCm: 88 },
  { name: 'crash', frontCm: 30, rightCm: -44, radiusCm: 20, isDrum: false, cymbalUpCm: 128 },
  { name: 'ride', frontCm: 22, rightCm: 42, radiusCm: 25, isDrum: false, cymbalUpCm: 112 },
];
export const snareDepthCm = 14;
export const playerAt = { frontCm: -72, rightCm: 2, radiusCm: 15 } as const;

/** As at 1280 px: 520 px hold 302 cm. */
const fullWidthPx = 520;
const mostPxPerCm = 1.72;
/** Where the beater stands across the width. */
const beaterShare = 0.507;
const marginCm = 8;
const labelPx = 26;
const gapPx = 44;
const mostAbovePx = 380;
const mostSidePx = 460;

/** What both views show at least, from the beater: to the back, front, left, right and up. */
const least = { back: 92, front: 75, left: 76, right: 69, up: 160 };

export interface MicrophonePx {
  above: PointPx | null;
  side: PointPx | null;
}

export interface SetupLayout {
  widthPx: number;
  heightPx: number;
  pxPerCm: number;
  /** Both views share the axis from back to front. */
  xOf: (frontCm: number) => number;
  /** From above: the player's right is down. */
  yAboveOf: (rightCm: number) => number;
  ySideOf: (upCm: number) => number;
  floorY: number;
  sideTopY: number;
  kickMicrophone: MicrophonePx;
  overhead: MicrophonePx;
}

/** Where everything of both views lies: as large as fits, so that no microphone falls out of the picture. */
export function setupLayout(
  places: { kick: KickPlace; overhead: OverheadPlace },
  widthPx: number,
): SetupLayout {
  const microphones = [kickMicrophoneAt(places.kick), overheadAt(places.overhead)];
  const reach = reachOf(microphones);
  const beaterX = widthPx * beaterShare;
  const pxPerCm = Math.max(
    0.2,
    Math.min(
      (mostPxPerCm * widthPx) / fullWidthPx,
      mostPxPerCm,
      beaterX / reach.back,
      (widthPx - beaterX) / reach.front,
      mostAbovePx / (reach.left + reach.right),
      mostSidePx / reach.up,
    ),
  );
  const xOf = (frontCm: number) => beaterX + frontCm * pxPerCm;
  const aboveY = labelPx / 2 + reach.left * pxPerCm;
  const yAboveOf = (rightCm: number) => aboveY + rightCm * pxPerCm;
  const sideTopY = yAboveOf(reach.right) + gapPx;
  const floorY = sideTopY + reach.up * pxPerCm;
  const ySideOf = (upCm: number) => floorY - upCm * pxPerCm;
  const placed = ({ frontCm, rightCm, upCm }: PlaceCm): MicrophonePx => ({
    above: frontCm === null || rightCm === null ? null : { x: xOf(frontCm), y: yAboveOf(rightCm) },
    side: frontCm === null || upCm === null ? null : { x: xOf(frontCm), y: ySideOf(upCm) },
  });
  return {
    widthPx,
    heightPx: floorY + labelPx,
    pxPerCm,
    xOf,
    yAboveOf,
    ySideOf,
    floorY,
    sideTopY,
    kickMicrophone: placed(microphones[0]),
    overhead: placed(microphones[1]),
  };
}

function reachOf(places: readonly PlaceCm[]): typeof least {
  const reach = { ...least };
  for (const { frontCm, rightCm, upCm } of places) {
    reach.back = Math.max(reach.back, -(frontCm ?? 0) + marginCm);
    reach.front = Math.max(reach.front, (frontCm ?? 0) + marginCm);
    reach.left = Math.max(reach.left, -(rightCm ?? 0) + marginCm);
    reach.right = Math.max(reach.right, (rightCm ?? 0) + marginCm);
    reach.up = Math.max(reach.up, (upCm ?? 0) + marginCm);
  }
  return reach;
}

const radians = (degrees: number) => (degrees / 180) * Math.PI;

/** Where a kick microphone looks, from above: at the beater, and turned away from it. */
export function lookFromAbove(from: PointPx, beater: PointPx, turnedDeg: number, lengthPx: number): PointPx {
  const angle = Math.atan2(beater.y - from.y, beater.x - from.x) + radians(turnedDeg);
  return { x: from.x + lengthPx * Math.cos(angle), y: from.y + lengthPx * Math.sin(angle) };
}

/** Where an overhead looks, from the side: down, and tilted to the front. */
export function lookFromSide(from: PointPx, tiltedDeg: number, lengthPx: number): PointPx {
  const angle = radians(tiltedDeg);
  return { x: from.x + lengthPx * Math.sin(angle), y: from.y + lengthPx * Math.cos(angle) };
}
