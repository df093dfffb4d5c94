import type { Agreement } from '@thudline/contracts';
import type { Choice } from '@thudline/dsp';
import { milliseconds } from '../../../lib/format';

type MeasuredChoice = Pick<Agreement['choices'][number], 'name' | 'shiftMs' | 'flipped'>;

export interface NamedChoice extends Choice {
  name: MeasuredChoice['name'] | 'own';
  /** As it stands on the page: "flipped", "1.6 ms earlier". */
  label: string;
  /** As it stands under a tick of the low-end line, where "flipped or not" must be said. */
  tickLabel: string;
}

const shiftWords = (shiftMs: number, digits: number) =>
  `${milliseconds(Math.abs(shiftMs), digits)} ${shiftMs < 0 ? 'later' : 'earlier'}`;

/** Half of what is shown of a player's own shift: two that read alike are one choice. */
const sameShiftMs = 0.005;

export const sameChoice = (a: Pick<Choice, 'flipped' | 'shiftMs'>, b: Pick<Choice, 'flipped' | 'shiftMs'>) =>
  a.flipped === b.flipped && Math.abs(a.shiftMs - b.shiftMs) < sameShiftMs;

/** A choice told by its parts. */
export function choiceWords({ flipped, shiftMs }: Pick<Choice, 'flipped' | 'shiftMs'>, digits = 1): string {
  const shifted = Math.abs(shiftMs) >= sameShiftMs;
  if (!shifted) return flipped ? 'flipped' : 'as recorded';
  const words = shiftWords(shiftMs, digits);
  return flipped ? `flipped, ${words}` : words;
}

function labelsOf(choice: MeasuredChoice) {
  const best = choice.name === 'best-shift' ? ': best' : '';
  const shiftedOnly = !choice.flipped && Math.abs(choice.shiftMs) >= sameShiftMs;
  const words = choiceWords(choice) + best;
  return { label: words, tickLabel: shiftedOnly ? `not flipped, ${words}` : words };
}

/** Without a kick hit nothing can be compared, but the take can still be heard. */
const onlyAsRecorded: MeasuredChoice[] = [{ name: 'as-recorded', flipped: false, shiftMs: 0 }];

/** The choices a report names, all at one gain of the overhead. */
export function namedChoices({ choices }: Agreement, gainDb: number): NamedChoice[] {
  return (choices.length > 0 ? choices : onlyAsRecorded).map((choice) => ({
    name: choice.name,
    flipped: choice.flipped,
    shiftMs: choice.shiftMs,
    gainDb,
    ...labelsOf(choice),
  }));
}

/** A choice the report has no name for. */
export function ownChoice(choice: Choice): NamedChoice {
  const label = choiceWords(choice, 2);
  return { ...choice, name: 'own', label, tickLabel: label };
}
