import { EntityManager, UniqueConstraintViolationException } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { JoinRequest, SignInRequest } from '@thudline/contracts';
import { AuditService } from '../audit/audit.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { MailQueue } from '../mail/mail-queue';
import { InstallationService } from '../settings/installation.service';
import { ThrottleService } from '../throttle/throttle.service';
import { isClosed } from '../users/closed-account';
import { User } from '../users/entities/user.entity';
import { isInvited } from './invitation-token';
import { PasswordsService } from './passwords.service';

@Injectable()
export class AuthService {
  constructor(
    private readonly em: EntityManager,
    private readonly passwords: PasswordsService,
    private readonly throttle: ThrottleService,
    private readonly audit: AuditService,
    private readonly mails: MailQueue,
    private readonly installation: InstallationService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Account and mail together, or neither: without the mail nobody could show whose address it is. */
  async join(request: JoinRequest, address: string): Promise<User> {
    const { joinPerAddress, mailsPerAddress } = this.config.limits;
    await this.throttle.count({ key: 'join', address, limit: joinPerAddress, windowS: 3_600 });
    await this.throttle.count({ key: mailsKey, address, limit: mailsPerAddress, windowS: 3_600 });
    const { name, email, password } = request;
    await this.checkInvited(request);
    const passwordHash = await this.passwords.hash(password);
    try {
      return await this.em.transactional(async (em) => {
        const user = em.create(User, { name, email, emailLower: email.toLowerCase(), passwordHash });
        await em.flush();
        this.audit.record({ kind: 'joined', userId: user.id, address });
        await this.mails.sendWith(em, { kind: 'verify', userId: user.id });
        return user;
      });
    } catch (error) {
      if (error instanceof UniqueConstraintViolationException) throw emailTaken();
      throw error;
    }
  }

  private async checkInvited(request: JoinRequest): Promise<void> {
    const { signUp } = await this.installation.get();
    if (signUp === 'invited' && !isInvited(this.config.jwtSecret, request)) throw notInvited();
  }

  async signIn(request: SignInRequest, address: string): Promise<User> {
    const emailLower = request.email.toLowerCase();
    const { signInPerAccount, signInPerAddress } = this.config.limits;
    const account = `sign-in:account:${this.throttle.hashed(emailLower)}`;
    await this.throttle.count({ key: 'sign-in', address, limit: signInPerAddress, windowS: 900 });
    await this.throttle.count({ key: account, limit: signInPerAccount, windowS: 900 });
    const user = await this.em.findOne(User, { emailLower });
    const isRight = await this.passwords.matches(user?.passwordHash ?? null, request.password);
    if (!user || !isRight || isClosed(user)) {
      this.audit.record({ kind: 'sign-in-failed', userId: user?.id, address });
      await this.em.flush();
      throw new AppError('wrong-sign-in', 'That e-mail address and password do not belong together.');
    }
    await this.throttle.clear(account);
    this.audit.record({ kind: 'signed-in', userId: user.id, address });
    return user;
  }
}

/** Counts the mails to others that one address of the net asks for, whatever they are about. */
export const mailsKey = 'mails';

const notInvited = () =>
  new AppError(
    'forbidden',
    'Here one joins by invitation: open the link of the mail, and join with the address it came to.',
  );

export const emailTaken = () =>
  new AppError('email-taken', 'This e-mail address has an account already. Sign in instead.', {
    details: { fields: { email: 'This e-mail address has an account already.' } },
  });
