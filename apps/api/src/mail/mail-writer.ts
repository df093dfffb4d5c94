import { Injectable } from '@nestjs/common';
import { AccountMailWriter } from './account-mail-writer';
import { DigestMailWriter } from './digest-mail-writer';
import { InvitationMailWriter } from './invitation-mail-writer';
import { MailJob } from './mail-jobs';

/** Turns a job into a mail, or into nothing where there is nobody to write to any more. */
@Injectable()
export class MailWriter {
  constructor(
    private readonly accounts: AccountMailWriter,
    private readonly digests: DigestMailWriter,
    private readonly invitations: InvitationMailWriter,
  ) {}

  async write(job: MailJob): Promise<void> {
    if (job.kind === 'digest') return this.digests.write(job);
    if (job.kind === 'join-invitation') return this.invitations.write(job);
    return this.accounts.write(job);
  }
}
