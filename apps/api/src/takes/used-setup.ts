import { EntityManager } from '@mikro-orm/postgresql';
import { AppError } from '../errors/app-error';
import { Setup } from '../setups/entities/setup.entity';

/**
 * @returns the player's setup that a take is to have, null where none is named
 * @throws {AppError} `bad-request` where it isn't there, or isn't theirs
 */
export async function findUsedSetup(
  em: EntityManager,
  ownerId: string,
  setupId: string | null | undefined,
): Promise<Setup | null> {
  if (!setupId) return null;
  const setup = await em.findOne(Setup, { id: setupId, owner: ownerId });
  if (setup) return setup;
  throw new AppError('bad-request', 'This setup is not there any more.', {
    details: { fields: { setupId: 'This setup is not there any more.' } },
  });
}
