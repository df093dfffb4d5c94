import { Take } from '../takes/entities/take.entity';
import { Share } from './entities/share.entity';
import { tryOutTitle } from './try-out-words';

/** Everything a share may name, to be loaded with it. */
export const withSubject = ['take', 'otherTake', 'tryOut', 'room'] as const;

export const takeName = ({ title, number }: Pick<Take, 'title' | 'number'>): string =>
  title || `Take ${number}`;

/** @param share - with its subject. @returns what it opens, by its own name */
export function subjectName({ take, otherTake, tryOut, room }: Share): string {
  if (take && otherTake) return `${takeName(take.unwrap())} and ${takeName(otherTake.unwrap())}`;
  if (take) return takeName(take.unwrap());
  if (tryOut) return tryOutTitle(tryOut.unwrap());
  return room?.unwrap().name ?? '';
}
