import { setImmediate } from 'node:timers/promises';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { UserSettings } from '@thudline/contracts';
import {
  ComparedFigure,
  compareTakes,
  pooledTakes,
  roomChange,
  roomChangeKeys,
  RoomChangeTold,
  TakeFacts,
} from '@thudline/dsp';
import { storedFacts } from '../reports/report-columns';
import { Report } from '../reports/entities/report.entity';
import { fieldsOf } from '../setups/setups.mapper';
import { Take } from '../takes/entities/take.entity';
import { RoomChange } from './entities/room-change.entity';
import { Sides } from './room-change-sides';
import { betweenCaveat, comparability, Comparability } from './room-comparability';

/** What the log says of one change. */
export interface ToldChange extends RoomChangeTold {
  readonly caveats: readonly string[];
}

interface Compared {
  /** All changes of the room, oldest first. */
  changes: readonly RoomChange[];
  /** By change id; takes with their setups. */
  sides: ReadonlyMap<string, Sides>;
  lengthUnit: UserSettings['lengthUnit'];
}

/** What the reports of both sides say; they never change, so this doesn't either. */
interface Asked {
  before: string[];
  after: string[];
  alike: Comparability;
}

/** Some kilobytes each. */
const mostKept = 2000;

/** Tells what changes did, from the takes on both sides. */
@Injectable()
export class RoomComparisons {
  /** Told before, by the reports they were told from. */
  private readonly kept = new Map<string, RoomChangeTold>();

  constructor(private readonly em: EntityManager) {}

  /** @returns by change id; none where a side has no measured take */
  async of({ changes, sides, lengthUnit }: Compared): Promise<Map<string, ToldChange>> {
    const asked = [...sides].flatMap(([changeId, { before, after }]) => {
      const reports = { before: reportsOf(before), after: reportsOf(after) };
      if (reports.before.length === 0 || reports.after.length === 0) return [];
      const alike = comparability({ before: setupsOf(before), after: setupsOf(after), lengthUnit });
      const between = betweenCaveat(numbersBetween(changes, changeId, { before, after }));
      return { changeId, ...reports, alike, caveats: [...alike.caveats, ...between] };
    });
    const facts = await this.factsOf(asked.filter((one) => !one.alike.because && !this.kept.has(keyOf(one))));
    const told = new Map<string, ToldChange>();
    for (const { changeId, caveats, ...one } of asked)
      told.set(changeId, { ...(await this.told(one, facts)), caveats });
    return told;
  }

  private async told(asked: Asked, facts: ReadonlyMap<string, TakeFacts>): Promise<RoomChangeTold> {
    const { because } = asked.alike;
    if (because)
      return { status: 'cannot-tell', strong: 'Can’t be compared:', rest: `${because}.`, figures: [] };
    const key = keyOf(asked);
    const known = this.kept.get(key);
    if (known) return known;
    // A long log is told in pieces, so that others are answered in between.
    await setImmediate();
    const told = toldOf(asked, facts);
    this.kept.set(key, told);
    const [oldest] = this.kept.keys();
    if (this.kept.size > mostKept && oldest !== undefined) this.kept.delete(oldest);
    return told;
  }

  /** By report id; all at once, so that a long log asks the database once. */
  private async factsOf(asked: readonly Asked[]): Promise<Map<string, TakeFacts>> {
    const ids = [...new Set(asked.flatMap(({ before, after }) => [...before, ...after]))];
    if (ids.length === 0) return new Map();
    const em = this.em.fork();
    const reports = await em.find(Report, { measurement: { $in: ids } }, { populate: ['hits'] });
    return new Map(
      reports.map((report) => [report.measurement.id, storedFacts({ ...report, clipRuns: [] })]),
    );
  }
}

const keyOf = ({ before, after, alike: { gainKnownSame, gainChanged } }: Asked): string =>
  JSON.stringify([before, after, gainKnownSame, gainChanged]);

const reportsOf = (takes: readonly Take[]) => takes.flatMap(({ currentReportId }) => currentReportId ?? []);

const setupsOf = (takes: readonly Take[]) =>
  takes.map(({ setup }) => (setup ? fieldsOf(setup.unwrap()) : null));

function toldOf({ before, after, alike }: Asked, facts: ReadonlyMap<string, TakeFacts>): RoomChangeTold {
  const side = (ids: readonly string[]) => pooledTakes(ids.flatMap((id) => facts.get(id) ?? []));
  const figures = compareTakes({
    before: side(before),
    after: side(after),
    gainKnownSame: alike.gainKnownSame,
    keys: roomChangeKeys,
  });
  return roomChange(alike.gainChanged ? figures.filter((figure) => !isNoise(figure)) : figures);
}

/** A preamp that was turned up brings its noise along. */
const isNoise = ({ key }: ComparedFigure) => key.startsWith('noise');

/**
 * Changes after the earliest of the takes before and ahead of the latest of those after, counted as the log counts them.
 */
function numbersBetween(
  changes: readonly RoomChange[],
  changeId: string,
  { before, after }: Sides,
): number[] {
  const place = changes.findIndex(({ id }) => id === changeId);
  const days = [...before, ...after].map(({ recordedAt }) => recordedAt.toISOString().slice(0, 10));
  const [from = '', to = ''] = [days[0], days[days.length - 1]];
  return changes.flatMap(({ happenedOn }, i) => {
    // On the day of a take itself the order of the log says on which side of it a change stands.
    const isBetween = i < place ? happenedOn > from : i > place && happenedOn < to;
    return isBetween ? [i + 1] : [];
  });
}
