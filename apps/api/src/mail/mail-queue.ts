import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { QueueSender } from '../queue/queue-sender';
import { mailQueue } from '../queue/queue.schema';
import { MailJob } from './mail-jobs';

/** No page ever waits for a mail server: mails are sent by the worker, again and again until they are taken. */
@Injectable()
export class MailQueue {
  constructor(private readonly sender: QueueSender) {}

  /** Within the transaction of `em`: the mail is sent if and only if the rows are there. */
  sendWith(em: EntityManager, job: MailJob, options?: { startAfter: number }): Promise<void> {
    return this.sender.sendWith(em, mailQueue, job, options);
  }

  send(job: MailJob): Promise<void> {
    return this.sender.send(mailQueue, job);
  }
}
