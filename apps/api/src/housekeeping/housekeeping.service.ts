import { EntityManager } from '@mikro-orm/postgresql';
import { BeforeApplicationShutdown, Injectable, Logger, OnApplicationBootstrap } from '@nestjs/common';
import { Session } from '../auth/entities/session.entity';
import { purgeNotes } from '../notes/note-purge';
import { OneTimeToken } from '../tokens/entities/one-time-token.entity';
import { Throttle } from '../throttle/entities/throttle.entity';
import { StoreRepair } from './store-repair';
import { AccountPurge } from './account-purge';
import { ExportPurge } from './export-purge';
import { restorableSince } from '../takes/deleted-takes';
import { TryOut } from '../tryouts/entities/try-out.entity';
import { TakePurge } from './take-purge';

const hourMs = 60 * 60 * 1000;
const dayMs = 24 * hourMs;
/** Ended sessions stay this long, so that an old refresh token is still known for what it is. */
const endedSessionKeptMs = 30 * dayMs;

/** Removes rows that only the past needed. Any worker may do it, also two at the same time. */
@Injectable()
export class HousekeepingService implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(HousekeepingService.name);
  private timers: NodeJS.Timeout[] = [];

  constructor(
    private readonly em: EntityManager,
    private readonly purge: TakePurge,
    private readonly repair: StoreRepair,
    private readonly accounts: AccountPurge,
    private readonly exports: ExportPurge,
  ) {}

  onApplicationBootstrap(): void {
    const every = (ms: number, job: (now: Date) => Promise<unknown>) =>
      setInterval(() => {
        job(new Date()).catch((error: unknown) => this.logger.error(error, 'Housekeeping failed'));
      }, ms);
    this.timers = [every(hourMs, (now) => this.run(now)), every(dayMs, (now) => this.repair.run({ now }))];
  }

  beforeApplicationShutdown(): void {
    for (const timer of this.timers) clearInterval(timer);
  }

  async run(now: Date): Promise<void> {
    const em = this.em.fork();
    await em.nativeDelete(Throttle, { windowStart: { $lt: new Date(now.getTime() - dayMs) } });
    await em.nativeDelete(OneTimeToken, { expiresAt: { $lt: new Date(now.getTime() - dayMs) } });
    await em.nativeDelete(Session, { expiresAt: { $lt: new Date(now.getTime() - endedSessionKeptMs) } });
    await purgeNotes(em, now);
    await em.nativeDelete(TryOut, { deletedAt: { $lt: restorableSince(now) } });
    await this.purge.run(now);
    await this.exports.run(now);
    await this.accounts.run(now);
  }
}
