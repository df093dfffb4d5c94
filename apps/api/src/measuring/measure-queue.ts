import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { QueueSender } from '../queue/queue-sender';
import { measureQueue } from '../queue/queue.schema';

export interface MeasureJob {
  measurementId: string;
}

/** Behind every take that somebody waits for: those stand by how many their owner has waiting, never this far back. */
export const renewalPriority = -1_000_000;

interface SendOptions {
  measurementId: string;
  renewal?: boolean;
  /** Higher goes first. */
  priority?: number;
  afterS?: number;
}

@Injectable()
export class MeasureQueue {
  constructor(private readonly sender: QueueSender) {}

  /** Sends within the transaction of `em`: the job is there if and only if the rows are. */
  async send(
    em: EntityManager,
    { measurementId, renewal, priority = 0, afterS = 0 }: SendOptions,
  ): Promise<void> {
    const job: MeasureJob = { measurementId };
    const options = {
      singletonKey: measurementId,
      priority: renewal ? renewalPriority : priority,
      startAfter: afterS,
    };
    await this.sender.sendWith(em, measureQueue, job, options);
  }

  answers(): Promise<boolean> {
    return this.sender.answers(measureQueue);
  }
}
