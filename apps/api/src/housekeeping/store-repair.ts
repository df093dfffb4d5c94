import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable, Logger } from '@nestjs/common';
import { ObjectStoreService } from '../storage/object-store.service';
import { keptObjects, knownPrefixes } from './kept-objects';

/** Longer than the longest request and the longest measurement; what is younger may get its row yet. */
const graceMs = 24 * 60 * 60 * 1000;
const rowsAtOnce = 1_000;
const asksAtOnce = 8;

export interface RepairOptions {
  now: Date;
  graceMs?: number;
}

export interface RepairResult {
  /** How many objects the store holds. */
  objects: number;
  /** How many of them no row stood on, older than the grace time; they are gone now. */
  removed: number;
  /** Keys that rows stand on and the store doesn't have; a person has to look at them, or restore a backup. */
  missing: string[];
}

/** Finds objects without a row, which it removes, and rows without an object, which it only tells. */
@Injectable()
export class StoreRepair {
  private readonly logger = new Logger('Repair');

  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  /** @throws `storage-unavailable` where the object store doesn't answer; what was removed by then stays removed */
  async run({ now, graceMs: spared = graceMs }: RepairOptions): Promise<RepairResult> {
    const result: RepairResult = { objects: 0, removed: 0, missing: [] };
    const before = now.getTime() - spared;
    for await (const page of this.objects.pages()) {
      result.objects += page.length;
      const old = page.filter(({ key, storedAt }) => isKnown(key) && storedAt.getTime() < before);
      for (const key of await this.withoutRow(old.map(({ key }) => key))) {
        await this.objects.removeAll(key);
        result.removed += 1;
      }
    }
    for await (const keys of this.keysOfRows()) result.missing.push(...(await this.missing(keys)));
    if (result.missing.length > 0)
      this.logger.error({ keys: result.missing.slice(0, 100) }, 'Rows stand on objects that are not there');
    if (result.removed > 0) this.logger.log(`${result.removed} objects that no row stood on were removed`);
    return result;
  }

  private async withoutRow(keys: string[]): Promise<string[]> {
    if (keys.length === 0) return [];
    const kept = await this.rows(
      `select k.key from (${keptObjects}) k where k.key in (${keys.map(() => '?').join(', ')})`,
      keys,
    );
    return keys.filter((key) => !kept.includes(key));
  }

  /** In the order of the keys, so that each page goes on where the last one ended. */
  private async *keysOfRows(): AsyncGenerator<string[]> {
    let last = '';
    for (;;) {
      const page = await this.rows(
        `select k.key from (${keptObjects}) k where k.key collate "C" > ? order by k.key collate "C" limit ?`,
        [last, rowsAtOnce],
      );
      if (page.length > 0) yield page;
      if (page.length < rowsAtOnce) return;
      last = page.at(-1) ?? '';
    }
  }

  private async missing(keys: string[]): Promise<string[]> {
    const absent: string[] = [];
    for (let from = 0; from < keys.length; from += asksAtOnce) {
      const asked = keys.slice(from, from + asksAtOnce);
      const there = await Promise.all(asked.map((key) => this.objects.has(key)));
      absent.push(...asked.filter((_, index) => !there[index]));
    }
    // Removed in the meantime, together with their rows: nothing is wrong with them.
    const gone = await this.withoutRow(absent);
    return absent.filter((key) => !gone.includes(key));
  }

  private async rows(query: string, values: unknown[]): Promise<string[]> {
    const found = await this.em.fork().getConnection().execute<{ key: string }[]>(query, values);
    return found.map(({ key }) => key);
  }
}

const isKnown = (key: string) => knownPrefixes.some((prefix) => key.startsWith(prefix));
