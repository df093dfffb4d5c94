import type { TrackRole } from '@thudline/contracts';
import { guessRoles, guessSides, roleInName, stemOfName } from '@thudline/dsp';
import type { ReadyFile } from '../../upload/pickedFile';

/** What grouping needs to know of a file. */
export interface PairFile {
  id: string;
  name: string;
  channels: number;
  sampleRateHz: number;
  /** Of the first two channels; null for silence. */
  lowEndRatios: readonly (number | null)[];
}

export const pairFile = ({ id, file, reading }: ReadyFile): PairFile => ({
  id,
  name: file.name,
  channels: reading.facts.channels,
  sampleRateHz: reading.facts.sampleRateHz,
  lowEndRatios: reading.lowEndRatios,
});

/** One channel of one file. */
export interface Slot {
  fileId: string;
  channel: number;
}

/** The two microphones of one take; one may still be missing. */
export interface Pair {
  key: string;
  kick: Slot | null;
  overhead: Slot | null;
}

export const pairRoles = ['kick', 'overhead'] as const satisfies readonly TrackRole[];

const natural = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

/**
 * Which files belong together: a stereo file is a take of its own; of the others those whose names are alike but for the
 * microphone; what is left goes together in the order of the names, kick by kick where names tell the microphone.
 */
export function groupFiles(files: readonly PairFile[]): Pair[] {
  const stereo = files.filter(({ channels }) => channels > 1);
  const mono = files.filter(({ channels }) => channels === 1);
  const { pairs, left } = alikeNames(mono);
  const groups = [...stereo.map((file) => [file]), ...pairs, ...inOrder(left)];
  return groups
    .sort(([a], [b]) => natural.compare(sortName(a), sortName(b)) || natural.compare(a.name, b.name))
    .map(pairOf);
}

const sortName = ({ name }: PairFile) => stemOfName(name);

/** Groups of one kick and one overhead with the same rest of their names. */
function alikeNames(files: readonly PairFile[]): { pairs: PairFile[][]; left: PairFile[] } {
  const byStem = new Map<string, PairFile[]>();
  for (const file of files) {
    const stem = stemOfName(file.name);
    byStem.set(stem, [...(byStem.get(stem) ?? []), file]);
  }
  const pairs = [...byStem.values()].filter(
    (group) =>
      group.length === 2 && new Set(group.map(({ name }) => roleInName(name) ?? 'unknown')).size === 2,
  );
  const paired = new Set(pairs.flat());
  return { pairs, left: files.filter((file) => !paired.has(file)) };
}

function inOrder(files: readonly PairFile[]): PairFile[][] {
  const sorted = [...files].sort((a, b) => natural.compare(a.name, b.name));
  const of = (role: TrackRole | null) => sorted.filter(({ name }) => roleInName(name) === role);
  const [kicks, overheads, unknown] = [of('kick'), of('overhead'), of(null)];
  // Where only one microphone is named, the others are the other's.
  if (overheads.length === 0 && kicks.length === unknown.length) return zipped(kicks, unknown);
  if (kicks.length === 0 && overheads.length === unknown.length) return zipped(unknown, overheads);
  const twoByTwo = unknown.flatMap((_, i) => (i % 2 === 0 ? [unknown.slice(i, i + 2)] : []));
  return [...zipped(kicks, overheads), ...twoByTwo];
}

/** Side by side; what is left over of the longer list stands alone. */
const zipped = (some: readonly PairFile[], others: readonly PairFile[]): PairFile[][] =>
  Array.from({ length: Math.max(some.length, others.length) }, (_, i) =>
    [some[i], others[i]].filter((file) => file !== undefined),
  );

function pairOf([first, second]: PairFile[]): Pair {
  const key = first.id;
  if (first.channels > 1) {
    const [left = null, right = null] = first.lowEndRatios;
    const { kickChannel, overheadChannel } = guessSides(first.name, [left, right]);
    return {
      key,
      kick: { fileId: first.id, channel: kickChannel },
      overhead: { fileId: first.id, channel: overheadChannel },
    };
  }
  const slot = ({ id }: PairFile) => ({ fileId: id, channel: 0 });
  if (!second) {
    const role = roleInName(first.name) ?? 'kick';
    return { key, kick: null, overhead: null, [role]: slot(first) };
  }
  const [guess] = guessRoles(
    [first, second].map(({ name, lowEndRatios }) => ({ name, lowEndRatio: lowEndRatios[0] ?? null })),
  );
  return guess.role === 'kick'
    ? { key, kick: slot(first), overhead: slot(second) }
    : { key, kick: slot(second), overhead: slot(first) };
}

export const swapped = (pairs: readonly Pair[], key: string): Pair[] =>
  pairs.map((pair) => (pair.key === key ? { ...pair, kick: pair.overhead, overhead: pair.kick } : pair));

/** Puts a file into a place of a pair; what stood there goes where the file came from. Empty pairs are dropped. */
export function placed(
  pairs: readonly Pair[],
  { key, role, fileId }: { key: string; role: TrackRole; fileId: string },
): Pair[] {
  const displaced = pairs.find((pair) => pair.key === key)?.[role] ?? null;
  const origin = pairs
    .flatMap((pair) => pairRoles.map((of) => ({ pair, of })))
    .find(({ pair, of }) => pair[of]?.fileId === fileId);
  return pairs
    .map((pair) => {
      const next = { ...pair };
      if (origin && pair.key === origin.pair.key) next[origin.of] = displaced;
      if (pair.key === key) next[role] = { fileId, channel: 0 };
      return next;
    })
    .filter(({ kick, overhead }) => kick ?? overhead);
}

/** A pair that was taken out of the list takes its files with it. */
export const withoutFile = (pairs: readonly Pair[], fileId: string): Pair[] =>
  pairs
    .map((pair) => ({
      ...pair,
      kick: pair.kick?.fileId === fileId ? null : pair.kick,
      overhead: pair.overhead?.fileId === fileId ? null : pair.overhead,
    }))
    .filter(({ kick, overhead }) => kick ?? overhead);

const positionInName = /(\d+(?:\.\d+)?) (cm|in|deg|db)\b/;
const cmPerInch = 2.54;

/** A position that the name tells: "kick 90 cm.wav"; centimetres, degrees or decibels, null for none. */
export function positionOfName(name: string): number | null {
  const [, digits, unit] = positionInName.exec(stemOfName(name)) ?? [];
  if (digits === undefined) return null;
  return unit === 'in' ? Number(digits) * cmPerInch : Number(digits);
}
