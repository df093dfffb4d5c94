import { EntityManager } from '@mikro-orm/postgresql';
import { Measurement } from './entities/measurement.entity';

/** @returns by take id the latest measurement that somebody asked for: a renewal goes on behind the sheet */
export async function latestOf(em: EntityManager, takeIds: string[]): Promise<Map<string, Measurement>> {
  const asked = { take: { $in: takeIds }, renewal: false };
  const found = await em.find(Measurement, asked, { orderBy: { id: 'asc' } });
  return new Map(found.map((measurement) => [measurement.take.id, measurement]));
}
