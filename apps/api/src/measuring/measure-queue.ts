import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { QueueSender } from '../queue/queue-sender';
import { measureQueue } from '../queue/queue.schema';

export interface MeasureJob {
  measurementId: string;
}

interface SendOptions {
  measurementId: string;
  /** Higher goes first. */
  priority?: number;
  afterS?: number;
}

@Injectable()
export class MeasureQueue {
  constructor(private readonly sender: QueueSender) {}

  /** Sends within the transaction of `em`: the job is there if and only if the rows are. */
  async send(em: EntityManager, { measurementId, priority = 0, afterS = 0 }: SendOptions): Promise<void> {
    const job: MeasureJob = { measurementId };
    const options = { singletonKey: measurementId, priority, startAfter: afterS };
    await this.sender.sendWith(em, measureQueue, job, options);
  }

  answers(): Promise<boolean> {
    return this.sender.answers(measureQueue);
  }
}
