import { ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { Access } from './access.decorator';
import { AccessGuard } from './access.guard';
import { Viewer } from './viewer';

class Routes {
  undeclared(): void {}

  @Access.anyone()
  open(): void {}

  @Access.role('admin')
  forAdmins(): void {}
}

/** The guard as Nest calls it for a route, with somebody of these roles signed in. */
async function opens(route: keyof Routes, roles: string[] | null): Promise<boolean> {
  const viewer = roles && ({ user: { roles }, sessionId: 's' } as unknown as Viewer);
  const sessions = { findViewer: () => Promise.resolve(viewer) };
  const guard = new AccessGuard(
    new Reflector(),
    sessions as never,
    {} as never,
    {} as never,
    { jwtSecret: 'x' } as never,
  );
  const request = { cookies: { thudline_access: 'token' }, params: {} };
  const context = {
    getHandler: () => Object.getOwnPropertyDescriptor(Routes.prototype, route)?.value as unknown,
    getClass: () => Routes,
    switchToHttp: () => ({ getRequest: () => request }),
  } as unknown as ExecutionContext;
  return guard.canActivate(context).catch(() => false);
}

describe('AccessGuard', () => {
  it('refuses a route that declares no access, whoever asks', async () => {
    expect(await opens('undeclared', ['player', 'admin'])).toBe(false);
    expect(await opens('undeclared', null)).toBe(false);
  });

  it('opens to anyone what says so', async () => {
    expect(await opens('open', null)).toBe(true);
  });

  it('asks for the role a route declares; roles add up', async () => {
    expect(await opens('forAdmins', null)).toBe(false);
    expect(await opens('forAdmins', ['player', 'teacher'])).toBe(false);
    expect(await opens('forAdmins', ['player', 'admin'])).toBe(true);
  });
});
