import { paths } from '@thudline/contracts';

/** Every try-out and their list: what is told of one take may stand in any of them. */
export const isTryOutKey = (key: unknown) =>
  typeof key === 'string' && (key === paths.tryOuts || key.startsWith(`${paths.tryOuts}/`));
