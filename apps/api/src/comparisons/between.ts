import { DifferedRow, UserSettings } from '@thudline/contracts';
import { doneWords, GainBetween } from '@thudline/dsp';
import { TakeRights } from '../access/take-rights';
import { Setup } from '../setups/entities/setup.entity';
import { fieldsOf } from '../setups/setups.mapper';
import { Take } from '../takes/entities/take.entity';
import { gainsAlike, sameGroups, setupRows, switchedBetween } from './setup-rows';

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
  /** With their setups and rooms. */
  before: Take;
  after: Take;
  rights: TakeRights;
  lengthUnit: UserSettings['lengthUnit'];
}

export function between({ before, after, rights, lengthUnit }: BetweenParts): Between {
  const follows = (take: Take, other: Take) => take.followsTake?.id === other.id;
  const follower = follows(after, before) ? after : follows(before, after) ? before : null;
  const noted = follower?.doneActions ?? [];
  const { done, leftAlone } = doneWords(noted);
  const setups = setupsBetween(before, after, lengthUnit);
  const [roomBefore, roomAfter] = [roomOf(before), roomOf(after)];
  const room = { what: 'room', before: roomBefore, after: roomAfter };
  const sameRoom = roomBefore && before.room?.id === after.room?.id && `Room of both: ${roomBefore}.`;
  const doneOf = (take: Take) => (take === follower ? done.join(', ') : '');
  return {
    doneActions: follower === after ? noted : [],
    flip: setups.flip || noted.includes('flip-overhead'),
    gain: before.id === after.id ? 'same' : gainBetween(noted, setups.gain),
    differed: [
      ...(rights.own ? [room] : []),
      ...(rights.own ? setups.rows : []),
      { what: 'done in between', before: doneOf(before), after: doneOf(after) },
      ...(rights.own ? [{ what: 'tags', before: before.tags.join(', '), after: after.tags.join(', ') }] : []),
      { what: 'note', before: before.note, after: after.note },
    ].filter((row) => row.before !== row.after),
    same: [
      rights.own && sameRoom,
      rights.own && setups.same,
      leftAlone.length > 0 && `Left alone, as noted: ${listed(leftAlone)}.`,
    ]
      .filter(Boolean)
      .join(' '),
  };
}

const roomOf = ({ room }: Take) => room?.unwrap().name ?? '';

interface SetupsBetween {
  rows: DifferedRow[];
  same: string;
  /** Whether the switches are written down as turned between the two. */
  flip: boolean;
  /** Null where the setups don't say. */
  gain: GainBetween | null;
}

function setupsBetween(before: Take, after: Take, lengthUnit: UserSettings['lengthUnit']): SetupsBetween {
  const [from, to] = [before.setup?.unwrap() ?? null, after.setup?.unwrap() ?? null];
  const nameOf = (setup: Setup | null) => setup?.name ?? '';
  if (!from || !to) {
    const rows = [{ what: 'setup', before: nameOf(from), after: nameOf(to) }];
    return { rows: rows.filter((row) => row.before !== row.after), same: '', flip: false, gain: null };
  }
  const [fields, others] = [fieldsOf(from), fieldsOf(to)];
  const alike = gainsAlike(fields, others);
  const gain = alike === null ? null : alike ? 'same' : 'changed';
  // One setup for both says nothing of a switch that was pressed meanwhile.
  if (from.id === to.id) return { rows: [], same: `Setup of both: ${from.name}.`, flip: false, gain };
  return {
    rows: [{ what: 'setup', before: from.name, after: to.name }, ...setupRows(fields, others, lengthUnit)],
    same: sameWords(sameGroups(fields, others)),
    flip: switchedBetween(fields, others),
    gain,
  };
}

/** "The same in both setups: positions and microphones." */
const sameWords = (groups: readonly string[]) =>
  groups.length === 0 ? '' : `The same in both setups: ${joined(groups)}.`;

const gainActions = ['kick-gain', 'overhead-gain'];
const leftAloneActions = ['kick-gain-leave', 'overhead-gain-leave'];

/** That a preamp was turned outweighs a setup that was kept as it was. */
function gainBetween(noted: readonly string[], written: GainBetween | null): GainBetween {
  if (gainActions.some((id) => noted.includes(id))) return 'changed';
  if (written) return written;
  return leftAloneActions.every((id) => noted.includes(id)) ? 'same' : 'unknown';
}

/** "the kick preamp, the overhead preamp and the polarity switches" */
const listed = (words: readonly string[]) => joined(words.map((word) => `the ${word}`));

function joined(words: readonly string[]): string {
  const [last = ''] = words.slice(-1);
  return words.length === 1 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}
