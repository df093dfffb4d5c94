import { Inject, Injectable } from '@nestjs/common';
import * as argon2 from 'argon2';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';

@Injectable()
export class PasswordsService {
  private readonly options: argon2.Options;
  private readonly hashOfNobody: Promise<string>;

  constructor(@Inject(CONFIG) config: Config) {
    const { memoryKib, passes } = config.argon2;
    this.options = { type: argon2.argon2id, memoryCost: memoryKib, timeCost: passes, parallelism: 1 };
    this.hashOfNobody = this.hash('a password that nobody has');
  }

  async hash(password: string): Promise<string> {
    return argon2.hash(password, this.options);
  }

  /** Takes as long without a hash, so that the time doesn't tell which accounts exist. */
  async matches(hash: string | null, password: string): Promise<boolean> {
    const isRight = await argon2.verify(hash ?? (await this.hashOfNobody), password);
    return hash !== null && isRight;
  }
}
