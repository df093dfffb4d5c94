import { join } from 'node:path';
import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable, Logger } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { MeasurePool } from '../measuring/measure-pool';
import { StoredBytesDiffer, TakeFetcher } from '../measuring/take-fetcher';
import { objectKeys } from '../storage/object-keys';
import { ObjectStoreService } from '../storage/object-store.service';
import { ScratchService } from '../storage/scratch.service';
import { Take } from '../takes/entities/take.entity';
import { AddedFileClaim, AddedFileClaims } from './added-file-claims';

const unreachable = 'The recordings of this take could not be fetched. Make the file again later.';
const bytesDiffer = 'The stored recordings of this take are damaged. Upload it again.';
const broke = 'Making this file failed on our side. Try again, or tell whoever runs this site.';

/** Why a run was stopped from outside. */
type StopReason = 'lost' | 'shutting-down';

/** One attempt at one added file, from the claim to the stored object. */
@Injectable()
export class AddedFileRuns {
  private readonly logger = new Logger('Adding');
  private readonly stops = new Set<AbortController>();

  constructor(
    private readonly em: EntityManager,
    private readonly claims: AddedFileClaims,
    private readonly fetcher: TakeFetcher,
    private readonly pool: MeasurePool,
    private readonly objects: ObjectStoreService,
    private readonly scratch: ScratchService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Never throws for what one take does: its row says what became of it. */
  async run(claim: AddedFileClaim): Promise<void> {
    const stop = new AbortController();
    this.stops.add(stop);
    const folder = await this.scratch.make('measuring');
    const pulse = this.pulse(claim, stop);
    try {
      await this.make(claim, folder, { signal: stop.signal, onProgress: pulse.at });
    } catch (error) {
      await this.settle(claim, stop, error);
    } finally {
      pulse.end();
      this.stops.delete(stop);
      await this.scratch.remove(folder);
    }
  }

  stopAll(): void {
    for (const stop of this.stops) stop.abort('shutting-down' satisfies StopReason);
  }

  private async make(
    claim: AddedFileClaim,
    folder: string,
    { signal, onProgress }: { signal: AbortSignal; onProgress: (progress: number) => void },
  ): Promise<void> {
    const { takeId, choice } = claim;
    const inputs = await this.fetcher.fetch({ takeId, folder, signal });
    const take = await this.em.fork().findOneOrFail(Take, { id: takeId });
    const outPath = join(folder, 'added.wav');
    const job = { ...inputs, choice, outPath, about: aboutTake(take) };
    const result = await this.pool.add({ job, signal, onProgress });
    if (result.outcome === 'refused') return this.claims.fail(claim, result.refusal.message);
    const { facts } = result;
    const key = objectKeys.addedFile(claim);
    signal.throwIfAborted();
    await this.objects.putVerified({ key, path: outPath, bytes: facts.bytes, sha256: facts.sha256 });
    // A take that was purged meanwhile has no row left to point at the object.
    if (!(await this.claims.finish(claim, facts, key))) await this.objects.remove([key]);
  }

  /** Tells the database now and then that this run lives, and how far it is; stops it when it isn't ours any more. */
  private pulse(claim: AddedFileClaim, stop: AbortController) {
    let progress = 0;
    const beat = () => {
      this.claims.beat(claim, progress).then(
        (isOurs) => {
          if (!isOurs) stop.abort('lost' satisfies StopReason);
        },
        (error: unknown) => this.logger.warn(error, 'A heartbeat was missed'),
      );
    };
    const timer = setInterval(beat, Math.min(this.config.measuring.heartbeatMs, progressMs));
    return { at: (now: number) => (progress = now), end: () => clearInterval(timer) };
  }

  private async settle(claim: AddedFileClaim, stop: AbortController, error: unknown): Promise<void> {
    const reason: unknown = stop.signal.reason;
    if (stop.signal.aborted && reason === ('shutting-down' satisfies StopReason))
      return this.claims.giveBack(claim);
    if (stop.signal.aborted)
      return this.logger.log(claim, 'Stopped: removed, or taken over by another worker');
    this.logger.error(error, `Attempt ${claim.attempt} at added file ${claim.addedFileId} failed`);
    if (error instanceof StoredBytesDiffer) return this.claims.fail(claim, bytesDiffer);
    const isStoreDown = error instanceof AppError && error.code === 'storage-unavailable';
    return this.claims.retryLater(claim, isStoreDown ? unreachable : broke);
  }
}

/** Adding takes seconds, and somebody looks on. */
const progressMs = 1_000;

/** The same whenever it is made, so that another attempt makes the same bytes; times are UTC. */
function aboutTake({ number, title, recordedAt }: Take) {
  const [date = '', time = ''] = recordedAt.toISOString().slice(0, 19).split('T');
  return { name: title ? `Take ${number}, ${title}` : `Take ${number}`, date, time };
}
