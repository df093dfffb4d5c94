import type { TakeListItem } from '@thudline/contracts';

/** What the bar needs to know of a chosen take; it may lie on another page. */
export type ChosenTake = Pick<TakeListItem, 'id' | 'number' | 'recordedAt' | 'deletedAt'>;

type NumberedTake = Pick<ChosenTake, 'number'>;

/** More numbers than this are counted. */
const namedTakes = 4;

/** "take 12", "takes 12 and 14", "takes 3, 4, 5, 6 and 2 more". */
export function takeNumbers(takes: readonly NumberedTake[]): string {
  const numbers = takes.map(({ number }) => number).sort((a, b) => a - b);
  if (numbers.length <= 1) return `take ${numbers.join('')}`;
  if (numbers.length > namedTakes + 1)
    return `takes ${numbers.slice(0, namedTakes).join(', ')} and ${numbers.length - namedTakes} more`;
  return `takes ${numbers.slice(0, -1).join(', ')} and ${numbers.at(-1)}`;
}

/** "Take 12 is deleted." */
export function doneWords(takes: readonly NumberedTake[], what: string): string {
  const names = takeNumbers(takes);
  return `${names.charAt(0).toUpperCase()}${names.slice(1)} ${takes.length === 1 ? 'is' : 'are'} ${what}.`;
}

/** As they were recorded, the first one first. */
export const oldestFirst = (takes: readonly ChosenTake[]): ChosenTake[] =>
  [...takes].sort(
    (one, other) => Date.parse(one.recordedAt) - Date.parse(other.recordedAt) || one.number - other.number,
  );

/** What was typed with commas between; empty ones are left out. */
export const typedTags = (text: string): string[] => [
  ...new Set(
    text
      .split(',')
      .map((tag) => tag.trim())
      .filter(Boolean),
  ),
];
