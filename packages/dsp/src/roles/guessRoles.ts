import type { TrackRole } from '../facts';

/** What told the role: the file's name, its share of low end, or nothing but the order. */
export type RoleReason = 'name' | 'low-end' | 'order';

export interface RoleGuess {
  readonly role: TrackRole;
  readonly reason: RoleReason;
}

export interface RoleCandidate {
  readonly name: string;
  /** From `lowEndRatio`; null where it isn't known. */
  readonly lowEndRatio: number | null;
}

/** Which side of a stereo file is which microphone. */
export interface SidesGuess {
  readonly kickChannel: 0 | 1;
  readonly overheadChannel: 0 | 1;
  readonly reason: RoleReason;
}

/** How players and recorders name these files: common practice, no source. Words are whole, in lower case. */
const kickWords = new Set(
  'k,kick,kicks,kik,kck,kickin,kickout,kickdrum,bd,kd,bass drum,bassdrum,bdrum,bass dr,bombo,gran cassa,grosse caisse'.split(
    ',',
  ),
);
const overheadWords = new Set(
  'oh,ohs,ohl,ohr,ovh,ovhd,over,overs,overhead,overheads,over head,top,tops,cymbals,above'.split(','),
);

/** Two shares of low end closer than this say nothing about who is who; common practice, no source. */
const leastDifference = 0.05;

/**
 * Which file is the kick microphone's and which the overhead's, told by their names, else by their low end.
 *
 * @param files - two files of one take, in the order they were dropped
 * @returns one guess a file, in that order; exactly one of two files is the kick
 * @example
 * const files = [{ name: 'OH_01.wav', lowEndRatio: null }, { name: 'BD_01.wav', lowEndRatio: null }];
 * guessRoles(files).map(({ role }) => role) // ['overhead', 'kick']
 */
export function guessRoles(files: readonly RoleCandidate[]): RoleGuess[] {
  const named = files.map((file) => roleInName(file.name));
  if (files.length === 2) {
    const [kick, reason] = kickOfTwo(
      named,
      files.map((file) => file.lowEndRatio),
    );
    return files.map((_, i) => ({ role: i === kick ? 'kick' : 'overhead', reason }));
  }
  return named.map((role, i) => ({
    role: role ?? (i === 0 ? 'kick' : 'overhead'),
    reason: role ? 'name' : 'order',
  }));
}

/**
 * Which side of one stereo file is the kick: told by the order of both words in its name (`kick-overhead.wav`), else by
 * the low end of its sides.
 *
 * @param lowEndRatios - of the left and the right side, from `lowEndRatio`
 * @example
 * guessSides('take 3.wav', [0.1, 0.8]).kickChannel // 1
 */
export function guessSides(name: string, lowEndRatios: readonly [number | null, number | null]): SidesGuess {
  const words = roleWords(name);
  const byName =
    new Set(words).size === 2 ? (words.indexOf('kick') < words.indexOf('overhead') ? 0 : 1) : null;
  const [kick, reason] = byName === null ? kickOfTwo([null, null], lowEndRatios) : [byName, 'name' as const];
  return { kickChannel: kick === 0 ? 0 : 1, overheadChannel: kick === 0 ? 1 : 0, reason };
}

/** @returns index of the kick, and what told it */
function kickOfTwo(
  named: readonly (TrackRole | null)[],
  lowEndRatios: readonly (number | null)[],
): [number, RoleReason] {
  if (named[0] !== named[1]) {
    return [named[0] === 'kick' || named[1] === 'overhead' ? 0 : 1, 'name'];
  }
  const [first, second] = lowEndRatios;
  if (first !== null && second !== null && Math.abs(first - second) >= leastDifference) {
    return [first > second ? 0 : 1, 'low-end'];
  }
  return [0, 'order'];
}

/**
 * The one microphone a file's name speaks of.
 *
 * @returns null for none or both
 * @example
 * roleInName('Take3_BassDrum-02.wav') // 'kick'
 */
export function roleInName(name: string): TrackRole | null {
  const words = roleWords(name);
  return new Set(words).size === 1 ? words[0] : null;
}

/**
 * What is left of a file's name without its ending and the words for a microphone: `Kick 03.wav` and `OH 03.wav` both
 * give `3`. Words and numbers in lower case with one space between; numbers without leading zeros.
 * @example
 * stemOfName('Kick 03.wav') // '3'
 */
export function stemOfName(name: string): string {
  const parts = wordsOf(name, /[^\p{L}\p{N}.]+|(?<=\p{L})(?=\p{N})|(?<=\p{N})(?=\p{L})|\.(?!\d)|(?<!\d)\./u);
  const left: string[] = [];
  for (let i = 0; i < parts.length; i += 1) {
    const pair = `${parts[i]} ${parts[i + 1] ?? ''}`;
    if (kickWords.has(pair) || overheadWords.has(pair)) i += 1;
    else if (!kickWords.has(parts[i]) && !overheadWords.has(parts[i]))
      left.push(parts[i].replace(/^0+(?=\d)/, ''));
  }
  return left.join(' ');
}

/** The roles a name speaks of, in order. `Take3_BassDrum-02.wav` is take, 3, bass, drum, 02. */
function roleWords(name: string): TrackRole[] {
  const words = wordsOf(name, /[^\p{L}]+/u);
  return words.flatMap((word, i) => {
    const pair = `${word} ${words[i + 1] ?? ''}`;
    if (kickWords.has(word) || kickWords.has(pair)) return ['kick' as const];
    return overheadWords.has(word) || overheadWords.has(pair) ? ['overhead' as const] : [];
  });
}

function wordsOf(name: string, between: RegExp): string[] {
  return name
    .replace(/\.[^.]*$/, '')
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .toLowerCase()
    .split(between)
    .filter((word) => word !== '');
}
