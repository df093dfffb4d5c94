import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { validate } from 'uuid';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError, notFound } from '../errors/app-error';
import { isClosed } from '../users/closed-account';
import { User } from '../users/entities/user.entity';
import { SessionTokens } from './auth-cookies';
import { Session } from './entities/session.entity';
import { isGenuine, parseRefreshToken, refreshSeed, refreshTokenText } from './refresh-token';

const dayMs = 24 * 60 * 60 * 1000;
/** A session ends when it wasn't used for this long. */
const keptMs = { stay: 30 * dayMs, leave: dayMs };
/** A phone reads along for an evening; using it doesn't make it longer. */
const readOnlyMs = dayMs / 2;
/** Tabs that refresh at the same moment, and clients whose answer got lost. */
const previousTokenGraceMs = 60_000;

interface AccessClaims {
  sub: string;
  sid: string;
}

const sessionEnded = () =>
  new AppError('session-ended', 'You have been signed out here. Sign in again to go on.');

@Injectable()
export class SessionsService {
  constructor(
    private readonly em: EntityManager,
    private readonly jwt: JwtService,
    private readonly audit: AuditService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async start(user: User, stay: boolean, userAgent: string | null): Promise<SessionTokens> {
    return this.begin(user, { stay, readOnly: false, expiresAt: expiry(stay, new Date()), userAgent });
  }

  /** A session from which nothing can be changed. */
  async startReadOnly(user: User, userAgent: string | null): Promise<SessionTokens> {
    const expiresAt = new Date(Date.now() + readOnlyMs);
    return this.begin(user, { stay: true, readOnly: true, expiresAt, userAgent });
  }

  /** Reads session and user every time, so that signing out and locking act at once. */
  async findViewer(accessToken: string): Promise<Viewer | null> {
    const claims = await this.jwt.verifyAsync<AccessClaims>(accessToken).catch(() => null);
    if (!claims) return null;
    const session = await this.em.findOne(
      Session,
      { id: claims.sid, user: claims.sub, revokedAt: null, expiresAt: { $gt: new Date() } },
      { populate: ['user'] },
    );
    const user = session?.user.unwrap();
    return session && user && !isClosed(user)
      ? { user, sessionId: session.id, readOnly: session.readOnly }
      : null;
  }

  /** Asked outside of any request, by what stays open. @returns those of the sessions that are not over */
  async liveAmong(sessionIds: string[]): Promise<Set<string>> {
    const id = { $in: sessionIds };
    const now = new Date();
    const user = { lockedAt: null, $or: [{ deleteAfter: null }, { deleteAfter: { $gt: now } }] };
    const live = { id, revokedAt: null, expiresAt: { $gt: now }, user };
    const sessions = await this.em.fork().find(Session, live);
    return new Set(sessions.map((session) => session.id));
  }

  /** Changes the refresh token. The one before is good for a minute more; anything older ends the session. */
  async refresh(refreshToken: string): Promise<SessionTokens> {
    const session = await this.findGenuine(refreshToken);
    const generation = parseRefreshToken(refreshToken)?.generation;
    if (!session || session.revokedAt || session.expiresAt <= new Date()) throw sessionEnded();
    if (isClosed(session.user.unwrap())) throw sessionEnded();
    if (generation === session.generation) return this.rotate(session);
    const isRecent = Date.now() - session.rotatedAt.getTime() < previousTokenGraceMs;
    if (generation === session.generation - 1 && isRecent) return this.tokensOf(session);
    this.audit.record({ kind: 'session-reused', userId: session.user.id });
    session.revokedAt = new Date();
    await this.em.flush();
    throw sessionEnded();
  }

  /** Ends the session of a refresh or an access token, whichever is still there; safe to call twice. */
  async end(refreshToken: string | null, accessToken: string | null): Promise<void> {
    const viewer = accessToken ? await this.findViewer(accessToken) : null;
    const session = refreshToken
      ? await this.findGenuine(refreshToken)
      : viewer && (await this.em.findOne(Session, { id: viewer.sessionId }));
    if (!session || session.revokedAt) return;
    this.audit.record({ kind: 'signed-out', userId: session.user.id });
    session.revokedAt = new Date();
    await this.em.flush();
  }

  /** Ends every session of a person, save one where one is named. */
  async endAll(user: User, savedSessionId?: string): Promise<void> {
    const others = savedSessionId ? { id: { $ne: savedSessionId } } : {};
    await this.em.nativeUpdate(Session, { user, revokedAt: null, ...others }, { revokedAt: new Date() });
  }

  /** @returns those that are not over: the viewer's own first, then by when they were used */
  async list(viewer: Viewer): Promise<Session[]> {
    const live = { user: viewer.user, revokedAt: null, expiresAt: { $gt: new Date() } };
    const sessions = await this.em.find(Session, live, { orderBy: { rotatedAt: 'desc' }, limit: 100 });
    const isOwn = ({ id }: Session) => id === viewer.sessionId;
    return [...sessions.filter(isOwn), ...sessions.filter((session) => !isOwn(session))];
  }

  /** @throws {AppError} `not-found` where it is over or somebody else's */
  async endOne({ user }: Viewer, sessionId: string): Promise<void> {
    const live = { id: sessionId, user, revokedAt: null };
    const session = validate(sessionId) ? await this.em.findOne(Session, live) : null;
    if (!session) throw notFound();
    this.audit.record({ kind: 'signed-out', userId: user.id });
    session.revokedAt = new Date();
    await this.em.flush();
  }

  private async begin(
    user: User,
    kind: Pick<Session, 'stay' | 'readOnly' | 'expiresAt' | 'userAgent'>,
  ): Promise<SessionTokens> {
    const rotatedAt = new Date();
    const session = this.em.create(Session, {
      user,
      refreshSeed: refreshSeed(),
      generation: 0,
      rotatedAt,
      ...kind,
    });
    await this.em.flush();
    return this.tokensOf(session);
  }

  private async findGenuine(refreshToken: string): Promise<Session | null> {
    const token = parseRefreshToken(refreshToken);
    if (!token) return null;
    const session = await this.em.findOne(Session, { id: token.sessionId }, { populate: ['user'] });
    return session && isGenuine(token, this.config.jwtSecret, session.refreshSeed) ? session : null;
  }

  private async rotate(session: Session): Promise<SessionTokens> {
    const now = new Date();
    // Of two tabs with the same token one changes it; the other finds it changed and gets the same new one.
    const { id, generation, stay, readOnly } = session;
    const expiresAt = readOnly ? session.expiresAt : expiry(stay, now);
    const change = { generation: generation + 1, rotatedAt: now, expiresAt };
    await this.em.nativeUpdate(Session, { id, generation, revokedAt: null }, change);
    await this.em.refresh(session);
    if (session.revokedAt) throw sessionEnded();
    return this.tokensOf(session);
  }

  private async tokensOf(session: Session): Promise<SessionTokens> {
    const claims: AccessClaims = { sub: session.user.id, sid: session.id };
    const { id, refreshSeed: seed, generation } = session;
    return {
      access: await this.jwt.signAsync(claims),
      refresh: refreshTokenText(this.config.jwtSecret, seed, id, generation),
      keepMs: keepMs(session),
    };
  }
}

const expiry = (stay: boolean, now: Date) => new Date(now.getTime() + (stay ? keptMs.stay : keptMs.leave));

/** How long the browser keeps the cookies; null: until it closes. */
function keepMs({ stay, readOnly, expiresAt }: Session): number | null {
  if (readOnly) return expiresAt.getTime() - Date.now();
  return stay ? keptMs.stay : null;
}
