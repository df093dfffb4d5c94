import type { RoomChangeResponse } from '@thudline/contracts';

export interface HeadPart {
  strong: string;
  rest: string;
}

const lower = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
/** A second clause is read further down. */
const firstClause = (sentence: string) => sentence.replace(/, and .*$/, '.');
const named = (what: string) => what.replace(/[.:]+$/, '');

/** What the newest changes did, two at most: "**Moving blankets:** a snare dies 0.11 s sooner at 500 Hz." */
export function headSentence(changes: readonly RoomChangeResponse[]): HeadPart[] {
  const compared = changes.filter(({ figures }) => figures.length > 0).slice(0, 2);
  if (compared.length > 0)
    return compared.map(({ what, did }) => ({
      strong: `${named(what)}:`,
      rest: did.status === 'cannot-tell' ? 'no change we can measure.' : lower(firstClause(did.strong)),
    }));
  if (changes.length === 0)
    return [
      {
        strong: 'Nothing is written down yet.',
        rest: 'Say what you changed, and the takes show what it did.',
      },
    ];
  return [{ strong: 'Nothing can be compared yet.', rest: 'A change needs a take before it and one after.' }];
}
