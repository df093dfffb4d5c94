import { Injectable } from '@nestjs/common';
import { AccountMailWriter } from './account-mail-writer';
import { MailJob } from './mail-jobs';

/** Turns a job into a mail, or into nothing where there is nobody to write to any more. */
@Injectable()
export class MailWriter {
  constructor(private readonly accounts: AccountMailWriter) {}

  async write(job: MailJob): Promise<void> {
    return this.accounts.write(job);
  }
}
