import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiCookieAuth, ApiExtension } from '@nestjs/swagger';
import { Role } from '@thudline/contracts';
import type { TakeRight } from './take-rights';

export const ACCESS = Symbol('access');

/** What a route is about, where rights to it are given. */
export type SubjectKind = 'take' | 'deleted-take' | 'comparison' | 'try-out' | 'room';

export type AccessRule =
  | { kind: 'anyone' }
  | { kind: 'signed-in' }
  | { kind: 'role'; role: Role }
  | { kind: SubjectKind; right: TakeRight };

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
  /** The two takes are `:id` and `:otherId`. */
  comparison: (right: TakeRight) => access({ kind: 'comparison', right }, `right to ${right} the comparison`),
  /** The try-out is `:id`. */
  tryOut: (right: TakeRight) => access({ kind: 'try-out', right }, `right to ${right} the try-out`),
  /** The room is `:roomId`. */
  room: (right: TakeRight) => access({ kind: 'room', right }, `right to ${right} the room`),
  /** A take that may have been deleted by its player. */
  deletedTake: (right: TakeRight) =>
    access({ kind: 'deleted-take', right }, `right to ${right} the take, deleted or not`),
};
