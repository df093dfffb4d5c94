import type { PairSpectrum } from '../../facts';
import type { ActionId, Outcome, Reader, ReportFigures } from '../reportTypes';

/** Two takes, the second recorded after some actions of the first were carried out. */
export interface TakeAndNext {
  readonly before: ReportFigures;
  readonly after: ReportFigures;
  readonly doneActions: readonly string[];
  readonly reader: Reader;
  /** Pair spectra of both takes, where they are at hand: they tell a flip from anything else that moved. */
  readonly spectra?: { readonly before: PairSpectrum | null; readonly after: PairSpectrum | null };
}

export type OutcomeSaid = Omit<Outcome, 'actionId'>;

/** Tells what became of one action. */
export type OutcomeRule = (takes: TakeAndNext, actionId: ActionId) => OutcomeSaid;

export function said(status: Outcome['status'], strong: string, rest: string): OutcomeSaid {
  return { status, strong, rest };
}
