import type { Agreement } from '@thudline/contracts';
import type { Choice } from '@thudline/dsp';
import { useMemo, useState } from 'react';
import { namedChoices, ownChoice, sameChoice } from './choiceNames';

/**
 * Which choice is looked at and heard. Starts with what the verdict says, at matched levels. Every part can be set by
 * itself; a choice that has a name is known by it again.
 */
export function useChoice(agreement: Agreement) {
  const matchGainDb = agreement.matchGainDb ?? 0;
  const [choice, setChoice] = useState<Choice>(() => ({
    flipped: agreement.verdict === 'flip',
    shiftMs: 0,
    gainDb: matchGainDb,
  }));
  const named = useMemo(() => namedChoices(agreement, choice.gainDb), [agreement, choice.gainDb]);
  const known = named.find((each) => sameChoice(each, choice));
  const chosen = useMemo(() => known ?? ownChoice(choice), [known, choice]);
  const choices = useMemo(() => (known ? named : [...named, chosen]), [named, known, chosen]);
  return {
    /** Those with a name, and the player's own where it has none. */
    choices,
    named,
    asRecorded: named.find((each) => each.name === 'as-recorded') ?? named[0],
    chosen,
    matchGainDb,
    set: (part: Partial<Choice>) => setChoice((before) => ({ ...before, ...part })),
  };
}

export type Bench = ReturnType<typeof useChoice>;
