import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiCookieAuth, ApiExtension } from '@nestjs/swagger';
import { Role } from '@thudline/contracts';
import type { TakeRight } from './take-rights';

export const ACCESS = Symbol('access');

/** The route parameter that names a second take. */
export const OTHER_TAKE = 'otherId';

export type AccessRule =
  | { kind: 'anyone' }
  | { kind: 'signed-in' }
  | { kind: 'role'; role: Role }
  | { kind: 'take'; right: TakeRight; alsoDeleted?: true; alsoOf?: typeof OTHER_TAKE };

function access(rule: AccessRule, told: string) {
  const decorators = [SetMetadata(ACCESS, rule), ApiExtension('x-access', told)];
  return applyDecorators(...decorators, ...(rule.kind === 'anyone' ? [] : [ApiCookieAuth('access')]));
}

/** Who may call a route. Each route declares exactly one; a route that declares none is refused. */
export const Access = {
  anyone: () => access({ kind: 'anyone' }, 'anyone'),
  signedIn: () => access({ kind: 'signed-in' }, 'signed in'),
  role: (role: Role) => access({ kind: 'role', role }, `role ${role}`),
  /** The take is the one whose id is the route's `:id`. */
  take: (right: TakeRight) => access({ kind: 'take', right }, `right to ${right} the take`),
  /** The same for two takes, `:id` and `:otherId`: the right is needed to each of them. */
  takePair: (right: TakeRight) =>
    access({ kind: 'take', right, alsoOf: OTHER_TAKE }, `right to ${right} both takes`),
  /** The same where the take may have been deleted by its player. */
  deletedTake: (right: TakeRight) =>
    access({ kind: 'take', right, alsoDeleted: true }, `right to ${right} the take, deleted or not`),
};
