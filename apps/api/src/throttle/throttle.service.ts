import { createHash } from 'node:crypto';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { AppError } from '../errors/app-error';
import { Throttle } from './entities/throttle.entity';
import { networkOf } from './network-of';

interface Counted {
  key: string;
  /** Counted for this place in the net alone, see `networkOf`. */
  address?: string;
  limit: number;
  windowS: number;
}

/** Counters in the database, so that they hold over all processes. Windows start at whole multiples of their length. */
@Injectable()
export class ThrottleService {
  constructor(private readonly em: EntityManager) {}

  /** Counts one try, before it is made: tries at the same time can't slip past the limit. */
  async count({ key, address, limit, windowS }: Counted): Promise<void> {
    const windowMs = windowS * 1000;
    const windowStart = new Date(Math.floor(Date.now() / windowMs) * windowMs);
    const [row] = await this.em.getConnection().execute<{ count: number }[]>(
      `insert into throttle (key, window_start, count) values (?, ?, 1)
       on conflict (key, window_start) do update set count = throttle.count + 1 returning count`,
      [address === undefined ? key : `${key}:${networkOf(address)}`, windowStart],
    );
    if ((row?.count ?? 0) <= limit) return;
    const waitS = Math.max(1, Math.ceil((windowStart.getTime() + windowMs - Date.now()) / 1000));
    throw new AppError('too-many-requests', `Too many tries. Wait ${waitTold(waitS)}, then try again.`, {
      headers: { 'Retry-After': String(waitS) },
    });
  }

  async clear(key: string): Promise<void> {
    await this.em.nativeDelete(Throttle, { key });
  }

  /** For keys that name a person: the table needn't know who. */
  hashed(text: string): string {
    return createHash('sha256').update(text).digest('hex');
  }
}

function waitTold(waitS: number): string {
  const minutes = Math.ceil(waitS / 60);
  return minutes === 1 ? 'a minute' : `${minutes} minutes`;
}
