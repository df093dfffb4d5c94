import type { OpenedShareResponse } from '@thudline/contracts';

const dayMonth = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short' });

/** "open until 11 Dec", or until somebody ends it. */
export function openUntilWords({ expiresAt }: Pick<OpenedShareResponse, 'expiresAt'>): string {
  return expiresAt ? `open until ${dayMonth.format(new Date(expiresAt))}` : 'open until it is ended';
}
