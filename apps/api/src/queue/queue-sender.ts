import { EntityManager, Knex } from '@mikro-orm/postgresql';
import { Inject, Injectable, Logger, OnApplicationBootstrap, OnApplicationShutdown } from '@nestjs/common';
import PgBoss from 'pg-boss';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { createBoss } from './queue.schema';

interface SendOptions {
  /** Of two jobs with the same key only one waits. */
  singletonKey?: string;
  /** Higher goes first. */
  priority?: number;
  startAfter?: number;
}

/** The door to pg-boss for those who only send. */
@Injectable()
export class QueueSender implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger(QueueSender.name);
  private readonly boss: PgBoss;

  constructor(@Inject(CONFIG) config: Config) {
    this.boss = createBoss(config.databaseUrl, 'sends');
    this.boss.on('error', (error) => this.logger.error(error, 'The queue reports an error'));
  }

  async onApplicationBootstrap(): Promise<void> {
    await this.boss.start();
  }

  async onApplicationShutdown(): Promise<void> {
    await this.boss.stop({ graceful: false });
  }

  /** Sends within the transaction of `em`: the job is there if and only if the rows are. */
  async sendWith(em: EntityManager, queue: string, job: object, options: SendOptions = {}): Promise<void> {
    await this.boss.send(queue, job, { ...options, db: transactionOf(em) });
  }

  async send(queue: string, job: object): Promise<void> {
    await this.boss.send(queue, job);
  }

  async answers(queue: string): Promise<boolean> {
    return (await this.boss.getQueue(queue).catch(() => null)) !== null;
  }
}

interface PgConnection {
  query(text: string, values: unknown[]): Promise<{ rows: unknown[] }>;
}

function transactionOf(em: EntityManager): PgBoss.Db {
  const transaction = em.getTransactionContext<Knex.Transaction>();
  if (!transaction) throw new Error('A job is sent with the rows it is about: in a transaction.');
  const client = transaction.client as { acquireConnection(): Promise<PgConnection> };
  return {
    // Within a transaction this is always the transaction's own connection.
    executeSql: async (text, values) => (await client.acquireConnection()).query(text, values),
  };
}
