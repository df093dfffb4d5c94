import { OpenedShareResponse, ShareResponse } from '@thudline/contracts';
import { Share } from './entities/share.entity';

const told = (date: Date | null | undefined) => date?.toISOString() ?? null;

export function shareResponseOf(share: Share): ShareResponse {
  const { id, question, canListen, canDownload, openCount } = share;
  return {
    id,
    takeId: share.take.id,
    question,
    canListen,
    canDownload,
    createdAt: share.createdAt.toISOString(),
    expiresAt: told(share.expiresAt),
    revokedAt: told(share.revokedAt),
    openedAt: told(share.openedAt),
    openCount,
  };
}

/** @param share - with its owner */
export function openedShareResponseOf(share: Share): OpenedShareResponse {
  const { question, canListen, canDownload } = share;
  return {
    takeId: share.take.id,
    from: share.owner.unwrap().name,
    question,
    expiresAt: told(share.expiresAt),
    canListen,
    canDownload,
  };
}
