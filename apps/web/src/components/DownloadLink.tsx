import type { MouseEvent, ReactNode } from 'react';
import { keepSession, sessionIsSure } from '../lib/apiClient';

/** A file of ours to keep. A plain link can't renew the session, so it is seen to before the browser follows it. */
export function DownloadLink({ href, children }: { href: string; children: ReactNode }) {
  const onClick = async (event: MouseEvent<HTMLAnchorElement>) => {
    if (sessionIsSure()) return;
    event.preventDefault();
    const link = event.currentTarget;
    // Without an answer the browser's own message about the file is the better one.
    await keepSession().catch(() => undefined);
    const { href: address } = link;
    window.location.assign(address);
  };
  return (
    <a href={href} download onClick={(event) => void onClick(event)}>
      {children}
    </a>
  );
}
