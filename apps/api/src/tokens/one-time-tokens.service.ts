import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { AppError } from '../errors/app-error';
import { isClosed } from '../users/closed-account';
import { User } from '../users/entities/user.entity';
import { OneTimeToken, OneTimeTokenKind } from './entities/one-time-token.entity';
import { randomToken, tokenHash } from './random-token';

const minuteMs = 60 * 1000;
const dayMs = 24 * 60 * minuteMs;

/** How long each kind of link is good for; common practice, no source. */
export const tokenLifetimeMs: Record<OneTimeTokenKind, number> = {
  verify: 7 * dayMs,
  reset: 60 * minuteMs,
  phone: 10 * minuteMs,
  'new-address': dayMs,
};

export interface MadeToken {
  token: string;
  expiresAt: Date;
}

@Injectable()
export class OneTimeTokensService {
  constructor(private readonly em: EntityManager) {}

  /**
   * Writes a token with the database's own transaction of `em`.
   *
   * @param email - the address it is sent to, where that isn't the account's
   */
  async make(
    kind: OneTimeTokenKind,
    user: User,
    em: EntityManager = this.em,
    email = user.emailLower,
  ): Promise<MadeToken> {
    const token = randomToken();
    const expiresAt = new Date(Date.now() + tokenLifetimeMs[kind]);
    em.create(OneTimeToken, { kind, hash: tokenHash(token), user, email, expiresAt });
    await em.flush();
    return { token, expiresAt };
  }

  /** @returns the token's row with its user, used or not; null where it never was or is over */
  async find(kind: OneTimeTokenKind, token: string): Promise<OneTimeToken | null> {
    return this.em.findOne(
      OneTimeToken,
      { kind, hash: tokenHash(token), expiresAt: { $gt: new Date() } },
      { populate: ['user'] },
    );
  }

  /**
   * Uses a token up; of two who come with the same one at the same moment only one gets through.
   *
   * @returns whose it was
   * @throws {AppError} `link-ended`
   */
  async use(kind: OneTimeTokenKind, token: string): Promise<User> {
    const found = await this.find(kind, token);
    const user = found?.user.unwrap();
    if (!found || !user || isClosed(user) || found.email !== user.emailLower) throw linkEnded();
    const isFirst = await this.em.nativeUpdate(
      OneTimeToken,
      { id: found.id, usedAt: null },
      { usedAt: new Date() },
    );
    if (!isFirst) throw linkEnded();
    return user;
  }
}

export const linkEnded = () =>
  new AppError('link-ended', 'This link has ended or was used already. Ask for a new one.');
