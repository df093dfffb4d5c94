import { paths, takeResponse } from '@thudline/contracts';
import { Session } from '../lib/session';
import { waitUntil } from '../lib/waiting';
import { System } from './system';
import { SentTake, sendTake, sha256Of } from './uploads';

export interface Count {
  what: string;
  found: number;
  /** Anything but this is a failure. */
  wanted: number | null;
}

const measuredWithinMs = 15 * 60_000;
const mailedWithinMs = 10 * 60_000;

/** Looks at everything that was promised, once the faults are over. */
export async function lookAfterwards(
  system: System,
  player: Session,
  sent: readonly SentTake[],
  promisedMails: readonly string[],
): Promise<Count[]> {
  const acknowledged = sent.filter(({ takeId }) => takeId !== null);
  await allMeasured(system);
  const [lost, changed] = await compare(player, acknowledged);
  const rest = sent.filter(({ takeId }) => takeId === null);
  const again = await sendAgain(system, player, rest);
  await allMeasured(system);
  const [lostOfRest, changedOfRest] = await compare(player, rest);
  const first = repair(system);
  const second = repair(system);
  await waitUntil(
    'every promised mail arrives',
    () => Promise.resolve(system.mail.arrived.length >= promisedMails.length),
    mailedWithinMs,
  ).catch(() => undefined);
  return [
    { what: 'takes acknowledged while things broke', found: acknowledged.length, wanted: null },
    { what: 'of these, not there any more', found: lost, wanted: 0 },
    { what: 'of these, with other bytes', found: changed, wanted: 0 },
    { what: 'takes not acknowledged', found: rest.length, wanted: null },
    { what: 'of these, half there', found: again.half, wanted: 0 },
    { what: 'of these, another take when sent again', found: again.doubled, wanted: 0 },
    { what: 'of these, refused when sent again', found: again.refused, wanted: 0 },
    {
      what: 'of these, not there or with other bytes after that',
      found: lostOfRest + changedOfRest,
      wanted: 0,
    },
    { what: 'takes without exactly one report', found: await withoutOneReport(system), wanted: 0 },
    { what: 'takes more than were sent', found: (await takeCount(system)) - sent.length, wanted: 0 },
    { what: 'objects left without a row, removed by the repair', found: first.removed, wanted: null },
    { what: 'rows whose object is gone', found: first.missing.length, wanted: 0 },
    { what: 'left for a second repair', found: second.removed + second.missing.length, wanted: 0 },
    { what: 'mails promised', found: promisedMails.length, wanted: null },
    {
      what: 'mails that never came',
      found: Math.max(0, promisedMails.length - system.mail.arrived.length),
      wanted: 0,
    },
    { what: 'processes that ended by themselves', found: ownEnds(system), wanted: 0 },
  ];
}

async function allMeasured({ database }: System): Promise<void> {
  await waitUntil(
    'every take is measured',
    async () => {
      const [row] = await database.query<{ left: string }>(
        `select count(*) as left from measurement where state in ('queued', 'running')`,
      );
      return row?.left === '0';
    },
    measuredWithinMs,
  );
}

/** @returns how many takes are lost, and of how many the downloads aren't what was sent */
async function compare(player: Session, takes: readonly SentTake[]): Promise<[number, number]> {
  let [lost, changed] = [0, 0];
  for (const { takeId, sha256 } of takes) {
    const { status, json } = takeId ? await player.get(paths.take(takeId)) : { status: 404, json: null };
    if (status !== 200) {
      lost += 1;
      continue;
    }
    const { id, files } = takeResponse.parse(json);
    const stored: string[] = [];
    for (const file of files) {
      stored.push(sha256Of(await player.bytes(paths.takeFile(id, file.id)).catch(() => Buffer.alloc(0))));
    }
    if (stored.join() !== sha256.join()) changed += 1;
  }
  return [lost, changed];
}

/** What wasn't acknowledged is either absent or whole; under its key it becomes one take, twice asked the same one. */
async function sendAgain({ database }: System, player: Session, takes: readonly SentTake[]) {
  const result = { half: 0, doubled: 0, refused: 0 };
  for (const take of takes) {
    const [row] = await database.query<{ id: string; files: string; measurements: string }>(
      `select id, (select count(*) from take_file f where f.take_id = t.id) as files,
         (select count(*) from measurement m where m.take_id = t.id) as measurements
       from take t where upload_key = $1`,
      [take.uploadKey],
    );
    if (row && (row.files !== '2' || row.measurements === '0')) result.half += 1;
    take.takeId = await sendTake(player, take);
    const once = await sendTake(player, take);
    if (!take.takeId) result.refused += 1;
    if (once !== take.takeId || (row && row.id !== take.takeId)) result.doubled += 1;
  }
  return result;
}

async function withoutOneReport({ database }: System): Promise<number> {
  const [row] = await database.query<{ count: string }>(
    `select count(*) from take t where t.deleted_at is null and 1 <> (
       select count(*) from measurement m join report r on r.measurement_id = m.id where m.take_id = t.id)`,
  );
  return Number(row?.count);
}

async function takeCount({ database }: System): Promise<number> {
  const [row] = await database.query<{ count: string }>('select count(*) from take');
  return Number(row?.count);
}

const repair = (system: System) =>
  JSON.parse(system.run('repair-main.js', '--grace-hours=0')) as { removed: number; missing: string[] };

const ownEnds = ({ api, worker, store, database }: System) =>
  [api, worker, store, database.program].reduce((sum, { ownEnds: ends }) => sum + ends, 0);
