/**
 * What the mail queue carries: whom to write and why, never a token. The worker makes the token as it writes the mail, so
 * that none lies in the queue's tables; and whether an address has an account at all is looked up there, not while
 * somebody waits for an answer.
 */
export type MailJob =
  | { kind: 'verify'; userId: string }
  | { kind: 'reset'; email: string }
  /** To the address that is to be the account's. */
  | { kind: 'new-address'; userId: string; email: string }
  /** To the address as it is: that another is asked for. */
  | { kind: 'address-notice'; userId: string; email: string; newEmail: string }
  | { kind: 'deletion'; userId: string }
  /** To an address that has no account yet: that it may join. */
  | { kind: 'join-invitation'; email: string; fromUserId: string }
  /** What happened in the week before this moment. */
  | { kind: 'digest'; userId: string; until: string }
  /** Somebody wrote a note, or answered one; to one of those it is for. */
  | { kind: 'note'; noteId: string; userId: string }
  | { kind: 'answer'; noteId: string; userId: string }
  /** The player ticked what the note asked for, the last at this moment. */
  | { kind: 'ticked'; noteId: string; doneAt: string }
  | { kind: 'share'; shareId: string }
  /** A link was opened for the first time; to whoever made it. */
  | { kind: 'opened'; shareId: string };
