import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { QueueSender } from '../queue/queue-sender';
import { addedFileQueue } from '../queue/queue.schema';

export interface AddedFileJob {
  addedFileId: string;
}

@Injectable()
export class AddedFileQueue {
  constructor(private readonly sender: QueueSender) {}

  /** Sends within the transaction of `em`: the job is there if and only if the row is. */
  async send(em: EntityManager, addedFileId: string, afterS = 0): Promise<void> {
    const job: AddedFileJob = { addedFileId };
    await this.sender.sendWith(em, addedFileQueue, job, { singletonKey: addedFileId, startAfter: afterS });
  }
}
