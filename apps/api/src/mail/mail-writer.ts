import { Injectable } from '@nestjs/common';
import { AccountMailWriter } from './account-mail-writer';
import { DigestMailWriter } from './digest-mail-writer';
import { InvitationMailWriter } from './invitation-mail-writer';
import { MailJob } from './mail-jobs';
import { NoteMailWriter } from './note-mail-writer';
import { OpenedMailWriter } from './opened-mail-writer';
import { ShareMailWriter } from './share-mail-writer';

/** Turns a job into a mail, or into nothing where there is nobody to write to any more. */
@Injectable()
export class MailWriter {
  constructor(
    private readonly accounts: AccountMailWriter,
    private readonly digests: DigestMailWriter,
    private readonly invitations: InvitationMailWriter,
    private readonly notes: NoteMailWriter,
    private readonly openings: OpenedMailWriter,
    private readonly shares: ShareMailWriter,
  ) {}

  async write(job: MailJob): Promise<void> {
    if (job.kind === 'digest') return this.digests.write(job);
    if (job.kind === 'join-invitation') return this.invitations.write(job);
    if (job.kind === 'note' || job.kind === 'answer') return this.notes.writeNote(job);
    if (job.kind === 'ticked') return this.notes.writeTicked(job);
    if (job.kind === 'opened') return this.openings.write(job.shareId);
    if (job.kind === 'share') return this.shares.write(job.shareId);
    return this.accounts.write(job);
  }
}
