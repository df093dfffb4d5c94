import { paths } from '@thudline/contracts';

/** Every page of the list; a changed take can move rows from one page to the next. */
export const isTakesKey = (key: unknown) =>
  typeof key === 'string' && (key === paths.takes || key.startsWith(`${paths.takes}?`));

/** Everything that is known of one take: the take, its report, its pictures. */
export const isKeyOfTake = (takeId: string) => (key: unknown) =>
  typeof key === 'string' && (key === paths.take(takeId) || key.startsWith(`${paths.take(takeId)}/`));
