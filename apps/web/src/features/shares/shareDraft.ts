import type { CreateShareRequest, ShareSubject } from '@thudline/contracts';

export const openForChoices = ['1', '7', '30', 'day', 'never'] as const;
export type OpenForChoice = (typeof openForChoices)[number];

/** A link as it is being written. */
export interface ShareDraft {
  label: string;
  question: string;
  openFor: OpenForChoice;
  /** "2026-12-24", for `day`. */
  day: string;
  canListen: boolean;
  canDownload: boolean;
  canNote: boolean;
  /** Empty: none. */
  passphrase: string;
  /** Empty: the address is told on the page. */
  mailTo: string;
}

export const emptyDraft: ShareDraft = {
  label: '',
  question: '',
  openFor: '7',
  day: '',
  canListen: true,
  canDownload: false,
  canNote: false,
  passphrase: '',
  mailTo: '',
};

/** What is sent; a chosen day counts to its end, where the sender is. */
export function shareRequest(subject: ShareSubject, draft: ShareDraft): CreateShareRequest {
  const { label, question, openFor, day, canListen, canDownload, canNote } = draft;
  const isTake = subject.kind === 'take';
  return {
    subject,
    label,
    question,
    expiresInDays: openFor === 'never' || openFor === 'day' ? null : Number(openFor),
    ...(openFor === 'day' ? { expiresAt: new Date(`${day}T23:59:59`).toISOString() } : {}),
    ...(draft.passphrase.trim() ? { passphrase: draft.passphrase.trim() } : {}),
    ...(draft.mailTo.trim() ? { mailTo: draft.mailTo.trim() } : {}),
    canListen: canListen && subject.kind !== 'room',
    canDownload: isTake && canDownload,
    canNote: isTake && canNote,
  };
}

/** What stands in the way of sending it; empty for nothing. */
export function draftFault({ openFor, day }: ShareDraft): string {
  return openFor === 'day' && !day ? 'Choose the day until which it opens.' : '';
}
