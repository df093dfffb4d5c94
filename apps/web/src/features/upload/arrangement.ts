import type { TrackRole } from '@thudline/contracts';
import { guessRoles, guessSides, type RoleReason } from '@thudline/dsp';
import { isReady, type PickedFile, type ReadyFile } from './pickedFile';

/** One channel of one file, and which microphone it is held for. */
export interface Slot {
  key: string;
  fileId: string;
  channel: number;
  role: TrackRole;
  reason: RoleReason | 'chosen';
}

/** What somebody chose themselves; the other microphone follows. */
export interface ChosenRole {
  slotKey: string;
  role: TrackRole;
}

/** Which of the picked files make the take. */
export interface Arrangement {
  kind: 'nothing' | 'one-of-two' | 'pair' | 'stereo';
  slots: Slot[];
  /** In the order they are sent. */
  used: ReadyFile[];
  /** Good files for which there is no room: a take has two. */
  aside: ReadyFile[];
  ratesDiffer: boolean;
  reading: boolean;
}

export const canSend = ({ kind, ratesDiffer, reading }: Arrangement) =>
  (kind === 'pair' || kind === 'stereo') && !ratesDiffer && !reading;

/** The first two good files make the take, or one alone if it holds more than one channel. */
export function arrangement(files: readonly PickedFile[], chosen: ChosenRole | null): Arrangement {
  const ready = files.filter(isReady);
  const used = ready.slice(0, 2);
  const [first, second] = used;
  return {
    kind: kindOf(used),
    slots: withChoice(guessedSlots(used), chosen),
    used,
    aside: ready.slice(2),
    ratesDiffer:
      second !== undefined && first.reading.facts.sampleRateHz !== second.reading.facts.sampleRateHz,
    reading: files.some((picked) => picked.reading.kind === 'reading'),
  };
}

function kindOf(used: ReadyFile[]): Arrangement['kind'] {
  if (used.length === 2) return 'pair';
  if (used.length === 0) return 'nothing';
  return used[0].reading.facts.channels > 1 ? 'stereo' : 'one-of-two';
}

function guessedSlots(used: ReadyFile[]): Slot[] {
  if (kindOf(used) === 'stereo') return sideSlots(used[0]);
  const guesses = guessRoles(
    used.map(({ file, reading }) => ({ name: file.name, lowEndRatio: reading.lowEndRatios[0] })),
  );
  return used.map(({ id }, index) => ({ key: `${id}:0`, fileId: id, channel: 0, ...guesses[index] }));
}

function sideSlots({ id, file, reading }: ReadyFile): Slot[] {
  const [left, right] = reading.lowEndRatios;
  const { kickChannel, reason } = guessSides(file.name, [left, right]);
  return [0, 1].map((channel) => ({
    key: `${id}:${channel}`,
    fileId: id,
    channel,
    role: channel === kickChannel ? 'kick' : 'overhead',
    reason,
  }));
}

const otherRole = (role: TrackRole): TrackRole => (role === 'kick' ? 'overhead' : 'kick');

/** Two microphones can never have one role: choosing for one swaps the other. */
function withChoice(slots: Slot[], chosen: ChosenRole | null): Slot[] {
  if (!chosen || !slots.some((slot) => slot.key === chosen.slotKey)) return slots;
  return slots.map((slot) => ({
    ...slot,
    role: slot.key === chosen.slotKey ? chosen.role : otherRole(chosen.role),
    reason: 'chosen',
  }));
}
