import { paths } from '@thudline/contracts';

/** Every page of the list; a changed take can move rows from one page to the next. */
export const isTakesKey = (key: unknown) =>
  typeof key === 'string' && (key === paths.takes || key.startsWith(`${paths.takes}?`));

export const takesKey = (cursor: string | null) =>
  cursor ? `${paths.takes}?${new URLSearchParams({ cursor }).toString()}` : paths.takes;
