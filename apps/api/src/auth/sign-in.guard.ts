import { ExecutionContext, Injectable } from '@nestjs/common';
import { AuthGuard } from '@nestjs/passport';
import { signInRequest } from '@thudline/contracts';
import { Request } from 'express';
import { invalidInput } from '../errors/invalid-input';

/** passport-local behind the contract's checks: a guard runs before the pipes that would do them. */
@Injectable()
export class SignInGuard extends AuthGuard('local') {
  override canActivate(context: ExecutionContext) {
    const parsed = signInRequest.safeParse(context.switchToHttp().getRequest<Request>().body);
    if (!parsed.success) throw invalidInput(parsed.error);
    return super.canActivate(context);
  }

  override handleRequest<U>(error: Error | null, user: U | false): U {
    if (error) throw error;
    if (!user) throw new Error('The sign-in strategy gave neither a user nor an error.');
    return user;
  }
}
