import type { ActionId } from '../reportTypes';

/** What was carried out between two takes, and what was left alone on purpose, as a comparison names it. */
const words: Readonly<Record<ActionId, { readonly what: string; readonly left: boolean }>> = {
  'flip-overhead': { what: 'overhead polarity switched', left: false },
  'export-together': { what: 'both files exported together', left: false },
  'kick-gain': { what: 'kick preamp turned', left: false },
  'overhead-gain': { what: 'overhead preamp turned', left: false },
  'look-for-noise': { what: 'noise looked for', left: false },
  'leave-silence': { what: 'silence left before playing', left: false },
  'record-kicks': { what: 'hard kicks recorded', left: false },
  'compare-polarities': { what: 'polarities compared by ear', left: false },
  'kick-gain-leave': { what: 'kick preamp', left: true },
  'overhead-gain-leave': { what: 'overhead preamp', left: true },
  'polarity-leave': { what: 'polarity switches', left: true },
};

export interface DoneWords {
  /** "overhead polarity switched" */
  readonly done: readonly string[];
  /** "kick preamp" */
  readonly leftAlone: readonly string[];
}

/**
 * Words for actions that were carried out between two takes.
 *
 * @param doneActions - ids that nothing is known of are left out: a later version may have made them
 * @example
 * doneWords(['flip-overhead']).done // ['overhead polarity switched']
 */
export function doneWords(doneActions: readonly string[]): DoneWords {
  const known = (Object.keys(words) as ActionId[]).filter((id) => doneActions.includes(id));
  const told = (left: boolean): string[] =>
    known.flatMap((id) => (words[id].left === left ? [words[id].what] : []));
  return { done: told(false), leftAlone: told(true) };
}
