import { EntityManager } from '@mikro-orm/postgresql';
import { BeforeApplicationShutdown, Injectable, Logger, OnApplicationBootstrap } from '@nestjs/common';
import { Session } from '../auth/entities/session.entity';
import { OneTimeToken } from '../tokens/entities/one-time-token.entity';
import { Throttle } from '../throttle/entities/throttle.entity';
import { TakePurge } from './take-purge';

const hourMs = 60 * 60 * 1000;
const dayMs = 24 * hourMs;
/** Ended sessions stay this long, so that an old refresh token is still known for what it is. */
const endedSessionKeptMs = 30 * dayMs;

/** Removes rows that only the past needed. Any worker may do it, also two at the same time. */
@Injectable()
export class HousekeepingService implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(HousekeepingService.name);
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly em: EntityManager,
    private readonly purge: TakePurge,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setInterval(() => {
      this.run(new Date()).catch((error: unknown) => this.logger.error(error, 'Housekeeping failed'));
    }, hourMs);
  }

  beforeApplicationShutdown(): void {
    clearInterval(this.timer);
  }

  async run(now: Date): Promise<void> {
    const em = this.em.fork();
    await em.nativeDelete(Throttle, { windowStart: { $lt: new Date(now.getTime() - dayMs) } });
    await em.nativeDelete(OneTimeToken, { expiresAt: { $lt: new Date(now.getTime() - dayMs) } });
    await em.nativeDelete(Session, { expiresAt: { $lt: new Date(now.getTime() - endedSessionKeptMs) } });
    await this.purge.run(now);
  }
}
