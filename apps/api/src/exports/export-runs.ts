import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable, Logger } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { objectKeys } from '../storage/object-keys';
import { ObjectStoreService } from '../storage/object-store.service';
import { zipStream } from '../zip/zip-stream';
import { ExportClaim, ExportClaims } from './export-claims';
import { ExportContents } from './export-contents';

const unreachable = 'Your recordings could not be fetched. Ask for the archive again later.';
const broke = 'Making the archive failed on our side. Try again, or tell whoever runs this site.';

/** Why a run was stopped from outside. */
type StopReason = 'lost' | 'shutting-down';

/** Somebody may look on. */
const progressMs = 1_000;

/** One attempt at one export, from the claim to the stored object. */
@Injectable()
export class ExportRuns {
  private readonly logger = new Logger('Exports');
  private readonly stops = new Set<AbortController>();

  constructor(
    private readonly em: EntityManager,
    private readonly claims: ExportClaims,
    private readonly objects: ObjectStoreService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Never throws for what one account does: its row says what became of it. */
  async run(claim: ExportClaim): Promise<void> {
    const stop = new AbortController();
    this.stops.add(stop);
    const contents = new ExportContents(this.em.fork(), this.objects, claim.ownerId);
    const pulse = setInterval(
      () => this.beat(claim, contents.progress, stop),
      Math.min(this.config.measuring.heartbeatMs, progressMs),
    );
    try {
      await this.make(claim, contents, stop.signal);
    } catch (error) {
      await this.settle(claim, stop.signal, error);
    } finally {
      clearInterval(pulse);
      this.stops.delete(stop);
    }
  }

  stopAll(): void {
    for (const stop of this.stops) stop.abort('shutting-down' satisfies StopReason);
  }

  /** Nothing of it lies on this machine: what is read from the store goes into the archive, and that into the store. */
  private async make(claim: ExportClaim, contents: ExportContents, signal: AbortSignal): Promise<void> {
    const key = objectKeys.export(claim);
    const stored = await this.objects.putStream(key, zipStream(contents.entries()), signal);
    signal.throwIfAborted();
    // Of an account that went meanwhile no row is left to point at the object.
    if (!(await this.claims.finish(claim, stored, key))) await this.objects.remove([key]);
  }

  /** Tells the database that this run lives, and how far it is; stops it when it isn't ours any more. */
  private beat(claim: ExportClaim, progress: number, stop: AbortController): void {
    this.claims.beat(claim, progress).then(
      (isOurs) => {
        if (!isOurs) stop.abort('lost' satisfies StopReason);
      },
      (error: unknown) => this.logger.warn(error, 'A heartbeat was missed'),
    );
  }

  private async settle(claim: ExportClaim, signal: AbortSignal, error: unknown): Promise<void> {
    if (signal.aborted && signal.reason === ('shutting-down' satisfies StopReason))
      return this.claims.giveBack(claim);
    if (signal.aborted) return this.logger.log(claim, 'Stopped: removed, or taken over by another worker');
    this.logger.error(error, `Attempt ${claim.attempt} at export ${claim.exportId} failed`);
    const isStoreDown = error instanceof AppError && error.code === 'storage-unavailable';
    return this.claims.retryLater(claim, isStoreDown ? unreachable : broke);
  }
}
