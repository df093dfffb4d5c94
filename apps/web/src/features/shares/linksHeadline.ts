import type { ShareResponse } from '@thudline/contracts';
import { plural } from '../../lib/format';
import { isOpen } from './shareWords';

interface Words {
  strong: string;
  rest: string;
}

/** "3 links are open: 1 was not opened yet." */
export function linksHeadline(shares: readonly ShareResponse[], now: Date): Words {
  const open = shares.filter((share) => isOpen(share, now));
  if (open.length === 0) return { strong: 'No link is open.', rest: 'What you sent can’t be read any more.' };
  const unread = open.filter(({ openedAt }) => openedAt === null).length;
  const strong = `${plural(open.length, 'link')} ${open.length === 1 ? 'is' : 'are'} open:`;
  if (unread === 0) return { strong, rest: open.length === 1 ? 'it was opened.' : 'all were opened.' };
  if (unread === open.length)
    return { strong, rest: open.length === 1 ? 'it was not opened yet.' : 'none was opened yet.' };
  return { strong, rest: `${unread} ${unread === 1 ? 'was' : 'were'} not opened yet.` };
}
