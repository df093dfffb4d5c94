import { Injectable } from '@nestjs/common';
import { QueueSender } from '../queue/queue-sender';
import { mailQueue } from '../queue/queue.schema';
import { MailJob } from './mail-jobs';

/** No page ever waits for a mail server: mails are sent by the worker, again and again until they are taken. */
@Injectable()
export class MailQueue {
  constructor(private readonly sender: QueueSender) {}

  send(job: MailJob): Promise<void> {
    return this.sender.send(mailQueue, job);
  }
}
