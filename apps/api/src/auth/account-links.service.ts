import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { ChangePasswordRequest, ForgotRequest, ResetRequest } from '@thudline/contracts';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { MailQueue } from '../mail/mail-queue';
import { ThrottleService } from '../throttle/throttle.service';
import { OneTimeToken } from '../tokens/entities/one-time-token.entity';
import { linkEnded, OneTimeTokensService } from '../tokens/one-time-tokens.service';
import { User } from '../users/entities/user.entity';
import { mailsKey } from './auth.service';
import { OwnPassword } from './own-password';
import { PasswordsService } from './passwords.service';
import { SessionsService } from './sessions.service';

const hourS = 3_600;

/** Whose address it is, and how to get another password. */
@Injectable()
export class AccountLinksService {
  constructor(
    private readonly em: EntityManager,
    private readonly tokens: OneTimeTokensService,
    private readonly mails: MailQueue,
    private readonly passwords: PasswordsService,
    private readonly ownPassword: OwnPassword,
    private readonly sessions: SessionsService,
    private readonly throttle: ThrottleService,
    private readonly audit: AuditService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** May come twice: mail programs open links before people do. */
  async verify(token: string, address: string): Promise<void> {
    await this.countTry(address);
    const found = await this.tokens.find('verify', token);
    const user = found?.user.unwrap();
    if (!found || !user || found.email !== user.emailLower) throw linkEnded();
    const now = new Date();
    found.usedAt ??= now;
    user.emailVerifiedAt ??= now;
    await this.em.flush();
  }

  async resendVerification({ user }: Viewer): Promise<void> {
    const limit = this.config.limits.mailsPerAccount;
    await this.throttle.count({ key: `verify-mail:${user.id}`, limit, windowS: hourS });
    if (!user.emailVerifiedAt) await this.mails.send({ kind: 'verify', userId: user.id });
  }

  /** Does the same, and takes the same time, whether there is such an account or not: the worker finds out. */
  async forgot({ email }: ForgotRequest, address: string): Promise<void> {
    const { mailsPerAccount, mailsPerAddress } = this.config.limits;
    const account = `forgot:account:${this.throttle.hashed(email.toLowerCase())}`;
    await this.throttle.count({ key: mailsKey, address, limit: mailsPerAddress, windowS: hourS });
    await this.throttle.count({ key: account, limit: mailsPerAccount, windowS: hourS });
    await this.mails.send({ kind: 'reset', email });
  }

  /** Ends every session: whoever knew the old password is out. The mail has shown whose address it is. */
  async reset({ token, password }: ResetRequest, address: string): Promise<void> {
    await this.countTry(address);
    if (!(await this.tokens.find('reset', token))) throw linkEnded();
    const passwordHash = await this.passwords.hash(password);
    await this.em.transactional(async () => {
      const user = await this.tokens.use('reset', token);
      user.emailVerifiedAt ??= new Date();
      this.audit.record({ kind: 'password-reset', userId: user.id, address });
      await this.replacePassword(user, passwordHash);
    });
  }

  /** Ends every session but the one that asks. */
  async changePassword(viewer: Viewer, request: ChangePasswordRequest, address: string): Promise<void> {
    const { user } = viewer;
    await this.ownPassword.check(user, request.oldPassword, 'oldPassword');
    const passwordHash = await this.passwords.hash(request.password);
    await this.em.transactional(async () => {
      this.audit.record({ kind: 'password-changed', userId: user.id, address });
      await this.replacePassword(user, passwordHash, viewer.sessionId);
    });
  }

  /**
   * Within a transaction: password, links and sessions change together or not at all. Whoever held a link or a session
   * with the old password holds none with the new one.
   */
  private async replacePassword(user: User, passwordHash: string, savedSessionId?: string): Promise<void> {
    user.passwordHash = passwordHash;
    await this.em.flush();
    const open = { user, kind: { $in: ['reset', 'phone', 'new-address'] as const }, usedAt: null };
    await this.em.nativeUpdate(OneTimeToken, open, { usedAt: new Date() });
    await this.sessions.endAll(user, savedSessionId);
  }

  /** A token can't be guessed, so this only keeps the database from being asked for nothing. */
  private countTry(address: string): Promise<void> {
    const limit = this.config.limits.openLinkPerAddress;
    return this.throttle.count({ key: 'account-link', address, limit, windowS: 900 });
  }
}
