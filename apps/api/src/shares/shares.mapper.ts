import { OpenedShareResponse, ShareResponse } from '@thudline/contracts';
import { Share } from './entities/share.entity';
import { subjectName } from './subject-name';
import { subjectOf } from './share-subject';

const told = (date: Date | null | undefined) => date?.toISOString() ?? null;

/** @param share - with its subject */
export function shareResponseOf(share: Share): ShareResponse {
  const { id, label, question, canListen, canDownload, canNote, openCount } = share;
  return {
    id,
    subject: subjectOf(share),
    about: subjectName(share),
    label,
    question,
    canListen,
    canDownload,
    canNote,
    hasPassphrase: Boolean(share.passphraseHash),
    mailedTo: share.mailedTo ?? null,
    createdAt: share.createdAt.toISOString(),
    expiresAt: told(share.expiresAt),
    revokedAt: told(share.revokedAt),
    openedAt: told(share.openedAt),
    openCount,
  };
}

/** @param share - with its owner */
export function openedShareResponseOf(share: Share): OpenedShareResponse {
  const { question, canListen, canDownload, canNote } = share;
  return {
    subject: subjectOf(share),
    from: share.owner.unwrap().name,
    question,
    expiresAt: told(share.expiresAt),
    canListen,
    canDownload,
    canNote,
  };
}
