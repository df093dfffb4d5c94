import type { ComparedTake } from '@thudline/contracts';

/** "take 14, 8 cm inside, again" */
export const takeWords = ({ number, title }: Pick<ComparedTake, 'number' | 'title'>): string =>
  title ? `take ${number}, ${title}` : `take ${number}`;

export const comparePath = (beforeId: string, afterId: string): string => `/compare/${beforeId}/${afterId}`;
