import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { signInRequest } from '@thudline/contracts';
import { Request } from 'express';
import { Strategy } from 'passport-local';
import { User } from '../users/entities/user.entity';
import { AuthService } from './auth.service';

@Injectable()
export class LocalStrategy extends PassportStrategy(Strategy) {
  constructor(private readonly auth: AuthService) {
    super({ usernameField: 'email', passReqToCallback: true });
  }

  async validate(request: Request): Promise<User> {
    return this.auth.signIn(signInRequest.parse(request.body), request.ip ?? '');
  }
}
