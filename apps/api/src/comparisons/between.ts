import { DifferedRow } from '@thudline/contracts';
import { doneWords, GainBetween } from '@thudline/dsp';
import { TakeRights } from '../access/take-rights';
import { Take } from '../takes/entities/take.entity';

/** What was written down about two takes: what differed on purpose, and what was left alone. */
export interface Between {
  /** What was done of what the first take asked for; empty unless the second one follows it. */
  doneActions: string[];
  flip: boolean;
  gain: GainBetween;
  differed: DifferedRow[];
  same: string;
}

interface BetweenParts {
  before: Take;
  after: Take;
  rights: TakeRights;
}

export function between({ before, after, rights }: BetweenParts): Between {
  const follows = (take: Take, other: Take) => take.followsTake?.id === other.id;
  const follower = follows(after, before) ? after : follows(before, after) ? before : null;
  const noted = follower?.doneActions ?? [];
  const { done, leftAlone } = doneWords(noted);
  const doneOf = (take: Take) => (take === follower ? done.join(', ') : '');
  return {
    doneActions: follower === after ? noted : [],
    flip: noted.includes('flip-overhead'),
    gain: before.id === after.id ? 'same' : gainBetween(noted),
    differed: [
      { what: 'done in between', before: doneOf(before), after: doneOf(after) },
      ...(rights.own ? [{ what: 'tags', before: before.tags.join(', '), after: after.tags.join(', ') }] : []),
      { what: 'note', before: before.note, after: after.note },
    ].filter((row) => row.before !== row.after),
    same: leftAlone.length === 0 ? '' : `Left alone, as noted: ${listed(leftAlone)}.`,
  };
}

const gainActions = ['kick-gain', 'overhead-gain'];
const leftAloneActions = ['kick-gain-leave', 'overhead-gain-leave'];

function gainBetween(noted: readonly string[]): GainBetween {
  if (gainActions.some((id) => noted.includes(id))) return 'changed';
  return leftAloneActions.every((id) => noted.includes(id)) ? 'same' : 'unknown';
}

/** "the kick preamp, the overhead preamp and the polarity switches" */
function listed(words: readonly string[]): string {
  const named = words.map((word) => `the ${word}`);
  const [last = ''] = named.slice(-1);
  return named.length === 1 ? last : `${named.slice(0, -1).join(', ')} and ${last}`;
}
