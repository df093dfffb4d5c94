import {
  BeforeApplicationShutdown,
  Inject,
  Injectable,
  Logger,
  OnApplicationBootstrap,
} from '@nestjs/common';
import { takeAddedEvent } from '@thudline/contracts';
import { Client, Notification } from 'pg';
import { z } from 'zod';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';

const takeAddedNotice = takeAddedEvent.extend({ ownerId: z.uuid() });
export type TakeAddedNotice = z.infer<typeof takeAddedNotice>;

export interface NoticeListener {
  onMeasurement(takeId: string): void;
  onTakeAdded(notice: TakeAddedNotice): void;
  /** A note on the take came, went or changed, or something it asks for was ticked. */
  onNotes(takeId: string): void;
  /** The connection was away for a while: what happened then wasn't heard. */
  onGap(): void;
}

/** Soon enough that nobody notices, seldom enough for a database that is starting (common practice, no source). */
const reconnectMs = 1_000;

/** A database that takes longer to answer nothing is as good as gone (common practice, no source). */
const answerMs = 5_000;

/** The one connection of this process that listens to what the database tells of; see the migration tell-of-changes. */
@Injectable()
export class DatabaseNotices implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger('Events');
  private readonly listeners = new Set<NoticeListener>();
  private client: Client | null = null;
  private reconnecting: NodeJS.Timeout | undefined;
  private isStopping = false;

  constructor(@Inject(CONFIG) private readonly config: Config) {}

  listen(listener: NoticeListener): void {
    this.listeners.add(listener);
  }

  async onApplicationBootstrap(): Promise<void> {
    await this.connect();
  }

  async beforeApplicationShutdown(): Promise<void> {
    this.isStopping = true;
    clearTimeout(this.reconnecting);
    await this.client?.end();
  }

  /**
   * Asks the database whether it still hears us: a line that was cut without a word looks open for ever. Where it doesn't
   * answer in time the connection is given up, and another one made.
   */
  async check(): Promise<void> {
    const { client } = this;
    if (!client) return;
    try {
      await client.query('select 1');
    } catch (error) {
      this.logger.warn(error, 'The connection that listens does not answer');
      this.close(client);
    }
  }

  private async connect(): Promise<void> {
    const client = new Client({
      connectionString: this.config.databaseUrl,
      application_name: 'thudline-events',
      keepAlive: true,
      connectionTimeoutMillis: answerMs,
      query_timeout: answerMs,
    });
    client.on('notification', (notification) => this.pass(notification));
    client.on('error', (error) => this.logger.warn(error, 'The connection that listens broke'));
    client.on('end', () => {
      // One that was given up may end late, when another has taken its place.
      if (this.client === client) this.reconnect();
    });
    this.client = client;
    try {
      await client.connect();
      await client.query('listen thudline_measurement; listen thudline_take_added; listen thudline_notes');
    } catch (error) {
      this.close(client);
      throw error;
    }
  }

  private close(client: Client): void {
    client.end().catch((error: unknown) => this.logger.warn(error, 'A connection could not be closed'));
  }

  private reconnect(): void {
    if (this.isStopping) return;
    clearTimeout(this.reconnecting);
    this.reconnecting = setTimeout(() => {
      this.connect().then(
        () => this.listeners.forEach((listener) => listener.onGap()),
        (error: unknown) => {
          this.logger.warn(error, 'The database can’t be listened to; trying again');
          this.reconnect();
        },
      );
    }, reconnectMs);
  }

  private pass({ channel, payload }: Notification): void {
    if (payload === undefined) return;
    for (const listener of this.listeners) {
      if (channel === 'thudline_measurement') listener.onMeasurement(payload);
      else if (channel === 'thudline_notes') listener.onNotes(payload);
      else listener.onTakeAdded(takeAddedNotice.parse(JSON.parse(payload)));
    }
  }
}
