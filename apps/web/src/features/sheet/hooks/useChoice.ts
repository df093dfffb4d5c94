import type { Agreement } from '@thudline/contracts';
import type { Choice } from '@thudline/dsp';
import { useMemo, useState } from 'react';
import { milliseconds } from '../../../lib/format';

export type Balance = 'matched' | 'recorded';

export interface NamedChoice extends Choice {
  name: Agreement['choices'][number]['name'];
  /** As it stands on the page: "flipped", "1.6 ms earlier". */
  label: string;
  /** As it stands under a tick of the low-end line, where "flipped or not" must be said. */
  tickLabel: string;
}

function labelsOf({
  name,
  shiftMs,
  flipped,
}: Pick<Agreement['choices'][number], 'name' | 'shiftMs' | 'flipped'>) {
  const earlier = `${milliseconds(Math.abs(shiftMs))} ${shiftMs < 0 ? 'later' : 'earlier'}`;
  switch (name) {
    case 'as-recorded':
      return { label: 'as recorded', tickLabel: 'as recorded' };
    case 'flipped':
      return { label: 'flipped', tickLabel: 'flipped' };
    case 'shifted':
      return { label: earlier, tickLabel: `not flipped, ${earlier}` };
    case 'shifted-flipped':
      return { label: `flipped, ${earlier}`, tickLabel: `flipped, ${earlier}` };
    case 'best-shift':
      return {
        label: `${flipped ? 'flipped, ' : ''}${earlier}: best`,
        tickLabel: `${flipped ? 'flipped' : 'not flipped'}, ${earlier}: best`,
      };
  }
}

/** Without a kick hit nothing can be compared, but the take can still be heard. */
const onlyAsRecorded = [{ name: 'as-recorded', flipped: false, shiftMs: 0 } as const];

export function namedChoices(agreement: Agreement, balance: Balance): NamedChoice[] {
  const gainDb = balance === 'matched' ? (agreement.matchGainDb ?? 0) : 0;
  return (agreement.choices.length > 0 ? agreement.choices : onlyAsRecorded).map((choice) => ({
    name: choice.name,
    flipped: choice.flipped,
    shiftMs: choice.shiftMs,
    gainDb,
    ...labelsOf(choice),
  }));
}

/** Which choice is looked at and heard, at which balance. Starts with what the verdict says. */
export function useChoice(agreement: Agreement) {
  const [name, setName] = useState<NamedChoice['name']>(
    agreement.verdict === 'flip' ? 'flipped' : 'as-recorded',
  );
  const [balance, setBalance] = useState<Balance>('matched');
  const choices = useMemo(() => namedChoices(agreement, balance), [agreement, balance]);
  const asRecorded = choices.find((each) => each.name === 'as-recorded') ?? choices[0];
  const chosen = choices.find((each) => each.name === name) ?? asRecorded;
  return { choices, asRecorded, chosen, choose: setName, balance, setBalance };
}

export type Bench = ReturnType<typeof useChoice>;
