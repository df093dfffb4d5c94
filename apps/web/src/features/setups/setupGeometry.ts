import type { KickPlace, OverheadPlace } from '@thudline/contracts';

/** Centimetres from where the beater strikes, on the floor below it: to the front, to the player's right, up. */
export interface PlaceCm {
  frontCm: number | null;
  rightCm: number | null;
  upCm: number | null;
}

export type KnownPlaceCm = { [K in keyof PlaceCm]: number };

/**
 * The kit that places are told against: a 22-inch kick 41 cm deep, a 14-inch snare to its left, as a right-handed player
 * sits. Measured on no kit in particular; common practice, no source.
 */
export const usualKit = {
  beater: { frontCm: 0, rightCm: 0, upCm: 30 },
  kickDepthCm: 41,
  kickRadiusCm: 28,
  snare: { frontCm: -28, rightCm: -28, upCm: 66 },
} as const;

/** An empty field leaves its direction unknown. */
export function kickMicrophoneAt({ insideCm, offCentreCm, heightCm }: KickPlace): PlaceCm {
  return {
    frontCm: insideCm === null ? null : usualKit.kickDepthCm - insideCm,
    rightCm: offCentreCm,
    upCm: heightCm,
  };
}

export function overheadAt({ aboveSnareCm, towardKickCm, awayFromHatCm }: OverheadPlace): PlaceCm {
  const { frontCm, rightCm, upCm } = usualKit.snare;
  const from = (own: number, offset: number | null) => (offset === null ? null : own + offset);
  return {
    frontCm: from(frontCm, towardKickCm),
    rightCm: from(rightCm, awayFromHatCm),
    upCm: from(upCm, aboveSnareCm),
  };
}

export interface SetupDistances {
  beaterToKickCm: number | null;
  beaterToOverheadCm: number | null;
  /** How much further the kick's sound travels to the overhead; negative where it is nearer. */
  differenceCm: number | null;
}

export function setupDistances({
  kick,
  overhead,
}: {
  kick: KickPlace;
  overhead: OverheadPlace;
}): SetupDistances {
  const beaterToKickCm = distanceFromBeaterCm(kickMicrophoneAt(kick));
  const beaterToOverheadCm = distanceFromBeaterCm(overheadAt(overhead));
  return {
    beaterToKickCm,
    beaterToOverheadCm,
    differenceCm:
      beaterToKickCm === null || beaterToOverheadCm === null ? null : beaterToOverheadCm - beaterToKickCm,
  };
}

const isKnown = (place: PlaceCm): place is KnownPlaceCm =>
  place.frontCm !== null && place.rightCm !== null && place.upCm !== null;

function distanceFromBeaterCm(place: PlaceCm): number | null {
  if (!isKnown(place)) return null;
  const { beater } = usualKit;
  return Math.hypot(place.frontCm - beater.frontCm, place.rightCm - beater.rightCm, place.upCm - beater.upCm);
}
