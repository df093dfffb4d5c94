import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { ThrottleService } from '../throttle/throttle.service';
import { User } from '../users/entities/user.entity';
import { PasswordsService } from './passwords.service';

/** Asked once more before what can't be taken back: whoever sits at an open computer is not yet its owner. */
@Injectable()
export class OwnPassword {
  constructor(
    private readonly passwords: PasswordsService,
    private readonly throttle: ThrottleService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** @throws {AppError} `bad-request` that names `field`, `too-many-requests` */
  async check(user: User, password: string, field = 'password'): Promise<void> {
    const key = `own-password:${user.id}`;
    await this.throttle.count({ key, limit: this.config.limits.signInPerAccount, windowS: 900 });
    if (!(await this.passwords.matches(user.passwordHash, password))) throw wrongPassword(field);
    await this.throttle.clear(key);
  }
}

const wrongPassword = (field: string) =>
  new AppError('bad-request', 'That is not your password.', {
    details: { fields: { [field]: 'That is not your password.' } },
  });
