import type { FindingTopic, NotePin, NoteThread } from '@thudline/contracts';
import { addingUpTopics, balanceTopics, levelTopics, roomTopics } from '../sheet/components/sectionWords';

/** Stretches of a sheet that have a margin, from top to bottom. */
export const noteSections = ['top', 'levels', 'adding-up', 'drums', 'room', 'whole-take'] as const;
export type NoteSection = (typeof noteSections)[number];

export const sectionTitles: Record<NoteSection, string> = {
  top: 'the files',
  levels: 'Levels',
  'adding-up': 'Adding up',
  drums: 'Drums and cymbals',
  room: 'Room',
  'whole-take': 'Whole take',
};

const topicsOf: Record<Exclude<NoteSection, 'whole-take'>, readonly FindingTopic[]> = {
  top: ['files'],
  levels: levelTopics,
  'adding-up': addingUpTopics,
  drums: balanceTopics,
  room: roomTopics,
};

/** The topic that a note on a whole section is pinned to. */
export const mainTopic = {
  top: 'files',
  levels: 'kick-level',
  'adding-up': 'adding-up',
  drums: 'balance',
  room: 'room',
} as const satisfies Record<Exclude<NoteSection, 'whole-take'>, FindingTopic>;

/** In whose margin a note stands; null: it speaks of the take as a whole. Hits are drawn among the levels. */
export function sectionOf(pin: NotePin): NoteSection | null {
  switch (pin.kind) {
    case 'take':
      return null;
    case 'time':
      return 'whole-take';
    case 'hit':
      return 'levels';
    case 'finding': {
      const sections = Object.entries(topicsOf) as [NoteSection, readonly FindingTopic[]][];
      return sections.find(([, topics]) => topics.includes(pin.topic))?.[0] ?? null;
    }
  }
}

/** Behind which sentence a note's letter stands, by the name of the finding's place. */
export function markPlace(pin: NotePin): string | null {
  if (pin.kind === 'finding') return `mark:${pin.topic}`;
  if (pin.kind === 'hit') return 'mark:kick-level';
  return pin.kind === 'time' ? 'mark:whole-take' : null;
}

export interface LetteredThread {
  thread: NoteThread;
  section: NoteSection;
  letter: string;
}

/** a, b … z, aa, ab … */
function letterOf(index: number): string {
  const last = String.fromCharCode(97 + (index % 26));
  return index < 26 ? last : letterOf(Math.floor(index / 26) - 1) + last;
}

/**
 * What stands in the margins, lettered from the top of the sheet to its end: by section, within it by sentence, then by
 * time.
 *
 * @param there - the sections this sheet has; what is pinned elsewhere speaks of the take as a whole
 */
export function letteredThreads(
  threads: readonly NoteThread[],
  there: (section: NoteSection) => boolean,
): LetteredThread[] {
  return threads
    .flatMap((thread) => {
      const section = sectionOf(thread.pin);
      return section && there(section) ? [{ thread, section }] : [];
    })
    .sort((a, b) => rank(a) - rank(b) || compareTimes(a.thread, b.thread))
    .map((each, index) => ({ ...each, letter: letterOf(index) }));
}

function rank({ thread: { pin }, section }: Omit<LetteredThread, 'letter'>): number {
  const topics = section === 'whole-take' ? [] : topicsOf[section];
  const topic = pin.kind === 'finding' ? topics.indexOf(pin.topic) : 0;
  return noteSections.indexOf(section) * 100 + topic;
}

function compareTimes(a: NoteThread, b: NoteThread): number {
  const timeS = ({ pin }: NoteThread) => ('timeS' in pin ? pin.timeS : -1);
  return timeS(a) - timeS(b) || a.createdAt.localeCompare(b.createdAt);
}

/** What a note is about that is begun in a section's margin, until its writer chooses something else. */
export const startPin = (section: NoteSection, hitS: number): NotePin =>
  section === 'whole-take' ? { kind: 'time', timeS: hitS } : { kind: 'finding', topic: mainTopic[section] };
