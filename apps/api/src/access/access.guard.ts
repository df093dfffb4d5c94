import { CanActivate, ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { Role } from '@thudline/contracts';
import { SessionsService } from '../auth/sessions.service';
import { accessCookieOf } from '../auth/auth-cookies';
import { AppError, notFound } from '../errors/app-error';
import { ACCESS, AccessRule } from './access.decorator';
import { AccessService } from './access.service';
import { TakeRight, TakeRights } from './take-rights';
import { notSignedIn, Viewer, ViewerRequest } from './viewer';

/** Holds every route to the access it declares. */
@Injectable()
export class AccessGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly sessions: SessionsService,
    private readonly access: AccessService,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const targets = [context.getHandler(), context.getClass()];
    const rule = this.reflector.getAllAndOverride<AccessRule | undefined>(ACCESS, targets);
    if (!rule) throw forbidden();
    if (rule.kind === 'anyone') return true;
    const request = context.switchToHttp().getRequest<ViewerRequest>();
    const viewer = await this.viewerOf(request);
    request.viewer = viewer;
    if (rule.kind === 'role') this.checkRole(viewer, rule.role);
    if (rule.kind === 'take')
      request.rights = await this.checkTake(viewer, String(request.params.id), rule.right);
    return true;
  }

  private async viewerOf(request: ViewerRequest): Promise<Viewer> {
    const token = accessCookieOf(request);
    const viewer = token ? await this.sessions.findViewer(token) : null;
    if (!viewer) throw notSignedIn();
    return viewer;
  }

  private checkRole(viewer: Viewer, role: Role): void {
    if (!viewer.user.roles.includes(role)) throw forbidden();
  }

  private async checkTake(viewer: Viewer, takeId: string, right: TakeRight): Promise<TakeRights> {
    const rights = await this.access.take(viewer, takeId);
    if (!rights.read) throw notFound();
    if (!rights[right]) throw forbidden();
    return rights;
  }
}

const forbidden = () => new AppError('forbidden', 'This is not open to you.');
