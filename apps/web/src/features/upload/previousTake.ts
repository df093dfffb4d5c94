import type { NextAction, TakeResponse } from '@thudline/contracts';

/** The take a new one follows, with what its sheet asked for. */
export interface PreviousTake {
  take: Pick<TakeResponse, 'id' | 'number' | 'tickedActions'>;
  actions: NextAction[];
}

/** Which actions count as carried out: as ticked on the earlier sheet, until they are ticked anew here. */
export function doneActions({ take, actions }: PreviousTake, tickedHere: readonly string[] | null): string[] {
  const ticked = tickedHere ?? take.tickedActions;
  return actions.map(({ id }) => id).filter((id) => ticked.includes(id));
}
