import { createHash } from 'node:crypto';
import { Readable, Transform } from 'node:stream';
import { EntityManager } from '@mikro-orm/postgresql';
import { AddedFile } from '../added-files/entities/added-file.entity';
import { addedFileName } from '../added-files/added-files.mapper';
import { Photo } from '../photos/entities/photo.entity';
import { ReportsService } from '../reports/reports.service';
import { ObjectStoreService } from '../storage/object-store.service';
import { TakeFile } from '../takes/entities/take-file.entity';
import { Take } from '../takes/entities/take.entity';
import { safeFileName } from '../takes/upload/safe-file-name';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { jsonEntry, textEntry, ZipEntry } from '../zip/zip-stream';
import { exportedTables, secretColumns } from './export-tables';
import { readMe } from './read-me';
import { takesCsv, tryOutsCsv } from './export-sheets';

/** Read at a time, so that an account of any size is told in a little memory. */
const takesAtOnce = 20;

interface StoredBytes {
  path: string;
  objectKey: string;
  bytes: number;
  sha256?: string | null;
  modifiedAt: Date;
}

/** Everything of an account, one file after the other. */
export class ExportContents {
  private doneBytes = 0;
  private allBytes = 0;
  private readonly damaged: string[] = [];

  /** @param em - of its own: it is cleared now and then */
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
    private readonly ownerId: string,
  ) {}

  /** 0–1, by the bytes of recordings and photos that are through. */
  get progress(): number {
    return this.allBytes > 0 ? Math.min(1, this.doneBytes / this.allBytes) : 0;
  }

  async *entries(): AsyncGenerator<ZipEntry> {
    this.allBytes = await this.countBytes();
    const owner = await this.em.findOneOrFail(User, this.ownerId);
    yield textEntry('read me.txt', readMe(owner.name, new Date()));
    yield jsonEntry('account.json', accountOf(owner));
    for (const table of Object.keys(exportedTables))
      yield jsonEntry(`data/${table}.json`, await this.rows(table));
    yield textEntry('takes.csv', takesCsv(await this.em.execute(takesCsv.query, [this.ownerId])));
    yield textEntry('try-outs.csv', tryOutsCsv(await this.em.execute(tryOutsCsv.query, [this.ownerId])));
    yield* this.photos();
    yield* this.takes();
    if (this.damaged.length > 0)
      yield textEntry(
        'damaged.txt',
        `These are not the bytes that were uploaded:\n${this.damaged.join('\n')}\n`,
      );
  }

  private async *takes(): AsyncGenerator<ZipEntry> {
    for (let after = 0; ;) {
      this.em.clear();
      const takes = await this.em.find(
        Take,
        { owner: this.ownerId, deletedAt: null, number: { $gt: after } },
        { orderBy: { number: 'asc' }, limit: takesAtOnce, populate: ['room', 'setup'] },
      );
      for (const take of takes) yield* this.take(take);
      const last = takes.at(-1);
      if (!last) return;
      after = last.number;
    }
  }

  private async *take(take: Take): AsyncGenerator<ZipEntry> {
    const folder = `takes/${folderName(take)}`;
    yield jsonEntry(`${folder}/take.json`, this.takeTold(take));
    if (take.currentReportId) yield jsonEntry(`${folder}/report.json`, await this.reportOf(take));
    const files = await this.em.find(TakeFile, { take }, { orderBy: { position: 'asc' } });
    const names = differentNames(files.map(({ name }) => name));
    for (const [index, file] of files.entries())
      yield this.stored({ ...file, path: `${folder}/${names[index]}`, modifiedAt: take.recordedAt });
    const added = await this.em.find(AddedFile, { take, state: 'done' });
    const addedNames = differentNames(added.map((file) => addedFileName(file, take)));
    for (const [index, { objectKey, bytes, sha256, createdAt }] of added.entries()) {
      if (objectKey && bytes)
        yield this.stored({
          objectKey,
          bytes,
          sha256,
          path: `${folder}/added/${addedNames[index]}`,
          modifiedAt: createdAt,
        });
    }
  }

  private async *photos(): AsyncGenerator<ZipEntry> {
    for (const { id, objectKey, bytes, createdAt } of await this.em.find(Photo, { owner: this.ownerId }))
      yield this.stored({ objectKey, bytes, path: `photos/${id}.jpg`, modifiedAt: createdAt });
  }

  /** In the owner's own words and units. */
  private async reportOf(take: Take) {
    const reader = await this.em.findOneOrFail(User, this.ownerId);
    return new ReportsService(this.em).get({ takeId: take.id, reader });
  }

  private takeTold(take: Take) {
    const { number, title, note, recordedAt, tags, tickedActions, doneActions, room, setup } = take;
    return {
      number,
      title,
      note,
      recordedAt,
      tags,
      room: room?.unwrap().name ?? null,
      setup: setup?.unwrap().name ?? null,
      tickedActions,
      doneActions,
    };
  }

  private rows(table: string): Promise<unknown[]> {
    const where = (exportedTables[table] ?? 'false').replaceAll(':owner', '?');
    const times = where.split('?').length - 1;
    const secrets = secretColumns.map((column) => `'${column}'`).join(', ');
    return this.em
      .execute<{ row: unknown }[]>(
        `select to_jsonb(t) - array[${secrets}] as row from "${table}" t where ${where}`,
        Array.from({ length: times }, () => this.ownerId),
      )
      .then((found) => found.map(({ row }) => row));
  }

  /** Passed through as it is stored; what isn't what was uploaded is told at the end, and doesn't keep back the rest. */
  private stored({ path, objectKey, sha256, modifiedAt }: StoredBytes): ZipEntry {
    const open = async (): Promise<Readable> => {
      const hash = createHash('sha256');
      const watched = new Transform({
        transform: (chunk: Buffer, _encoding, done) => {
          hash.update(chunk);
          this.doneBytes += chunk.length;
          done(null, chunk);
        },
        flush: (done) => {
          if (sha256 && hash.digest('hex') !== sha256) this.damaged.push(path);
          done();
        },
      });
      const bytes = await this.objects.stream(objectKey);
      bytes.on('error', (error) => watched.destroy(error));
      watched.on('close', () => bytes.destroy());
      return bytes.pipe(watched);
    };
    return { path, modifiedAt, compress: false, open };
  }

  private async countBytes(): Promise<number> {
    const [row] = await this.em.execute<{ bytes: number }[]>(allBytes, [this.ownerId]);
    return row?.bytes ?? 0;
  }
}

const allBytes = `
  select (
    (select coalesce(sum(f.bytes), 0) from take_file f join take t on t.id = f.take_id
      where t.owner_id = u.id and t.deleted_at is null)
    + (select coalesce(sum(a.bytes), 0) from added_file a join take t on t.id = a.take_id
      where t.owner_id = u.id and t.deleted_at is null)
    + (select coalesce(sum(bytes), 0) from photo where owner_id = u.id))::float8 as bytes
  from "user" u where u.id = ?`;

function accountOf(owner: User) {
  const { name, email, emailVerifiedAt, roles, createdAt } = owner;
  return {
    name,
    email,
    emailVerifiedAt: emailVerifiedAt ?? null,
    roles,
    joinedAt: createdAt,
    settings: settingsOf(owner),
  };
}

/** "014 Loud chorus": sorted by number wherever folders are listed by name. */
function folderName({ number, title }: Take): string {
  const padded = String(number).padStart(3, '0');
  return title ? `${padded} ${safeFileName(title).replace(/\.+$/, '')}` : padded;
}

/** The same names, save that the second of two is "2 kick.wav". */
export function differentNames(names: readonly string[]): string[] {
  const seen = new Map<string, number>();
  return names.map((name) => {
    const count = (seen.get(name.toLowerCase()) ?? 0) + 1;
    seen.set(name.toLowerCase(), count);
    return count === 1 ? name : `${count} ${name}`;
  });
}
