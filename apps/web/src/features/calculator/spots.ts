import type { RoomSize } from '@thudline/dsp';
import { areaOf, type KnownRoom, type SurfacePlace } from './knownRoom';

/** Where something can be put up. */
export const spots = [
  'long-walls',
  'short-walls',
  'front',
  'back',
  'left',
  'right',
  'ceiling',
  'floor',
  'anywhere',
] as const;
export type Spot = (typeof spots)[number];

export const spotWords: Record<Spot, string> = {
  'long-walls': 'both long walls',
  'short-walls': 'both short walls',
  front: 'the front wall',
  back: 'the back wall',
  left: 'the left wall',
  right: 'the right wall',
  ceiling: 'the ceiling',
  floor: 'the floor',
  anywhere: 'its walls',
};

/** A room that is not a box has no walls that we know of. */
export const spotsOf = ({ size }: Pick<KnownRoom, 'size'>): readonly Spot[] =>
  size ? spots.filter((spot) => spot !== 'anywhere') : ['anywhere'];

/** The sides of the box behind a spot. */
export function placesOf(spot: Spot, { lengthM, widthM }: RoomSize): SurfacePlace[] {
  const alongLength: SurfacePlace[] = ['back', 'front'];
  const alongWidth: SurfacePlace[] = ['left', 'right'];
  if (spot === 'anywhere') return [];
  if (spot === 'long-walls') return lengthM >= widthM ? alongLength : alongWidth;
  if (spot === 'short-walls') return lengthM >= widthM ? alongWidth : alongLength;
  return [spot];
}

/** As much as can be put there. */
export function roomFor(spot: Spot, { size, surfaces }: Pick<KnownRoom, 'size' | 'surfaces'>): number {
  if (!size) return surfaces.reduce((sum, { areaM2 }) => sum + areaM2, 0);
  return placesOf(spot, size).reduce((sum, place) => sum + areaOf(place, size), 0);
}
