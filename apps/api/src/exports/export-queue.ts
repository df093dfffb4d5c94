import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { QueueSender } from '../queue/queue-sender';
import { exportQueue } from '../queue/queue.schema';

export interface ExportJob {
  exportId: string;
}

@Injectable()
export class ExportQueue {
  constructor(private readonly sender: QueueSender) {}

  /** Sends within the transaction of `em`: the job is there if and only if the row is. */
  async send(em: EntityManager, exportId: string, afterS = 0): Promise<void> {
    const job: ExportJob = { exportId };
    await this.sender.sendWith(em, exportQueue, job, { singletonKey: exportId, startAfter: afterS });
  }
}
