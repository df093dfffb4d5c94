import { EntityManager } from '@mikro-orm/postgresql';
import { Setting } from '../settings/entities/setting.entity';
import { Take } from '../takes/entities/take.entity';

const key = 'sample-take';

/** @returns the take whose sheet anybody may read and hear; null where this installation has none */
export async function sampleTakeId(em: EntityManager): Promise<string | null> {
  const setting = await em.findOne(Setting, { key });
  const take = setting && (await em.findOne(Take, { id: setting.value, deletedAt: null }));
  return take && take.currentReportId ? take.id : null;
}

/** @throws where there is no such take, or it has no sheet */
export async function chooseSampleTake(em: EntityManager, takeId: string): Promise<void> {
  const take = await em.findOne(Take, { id: takeId, deletedAt: null });
  if (!take?.currentReportId) throw new Error(`There is no measured take ${takeId}.`);
  await em.upsert(Setting, { key, value: takeId });
}
