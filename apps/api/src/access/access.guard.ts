import { CanActivate, ExecutionContext, Inject, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { Role } from '@thudline/contracts';
import { SessionsService } from '../auth/sessions.service';
import { accessCookieOf } from '../auth/auth-cookies';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError, notFound } from '../errors/app-error';
import { shareIdsOf } from '../shares/share-cookie';
import { ThrottleService } from '../throttle/throttle.service';
import { ACCESS, AccessRule } from './access.decorator';
import { AccessService } from './access.service';
import { readMethods } from './origin.guard';
import { OPEN_TO_READ_ONLY, readOnly } from './read-only';
import { shared, TakeRights } from './take-rights';
import { Asker, notSignedIn, Viewer, ViewerRequest } from './viewer';

type TakeRule = Extract<AccessRule, { kind: 'take' }>;

/** Holds every route to the access it declares. */
@Injectable()
export class AccessGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly sessions: SessionsService,
    private readonly access: AccessService,
    private readonly throttle: ThrottleService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const targets = [context.getHandler(), context.getClass()];
    const rule = this.reflector.getAllAndOverride<AccessRule | undefined>(ACCESS, targets);
    if (!rule) throw forbidden();
    if (rule.kind === 'anyone') return true;
    const request = context.switchToHttp().getRequest<ViewerRequest>();
    const asker = await this.askerOf(request);
    if (asker.viewer) request.viewer = asker.viewer;
    if (asker.viewer?.readOnly) this.checkReadOnly(request, targets);
    if (rule.kind === 'take') {
      if (!asker.viewer) await this.countGuest(request.ip ?? '');
      request.rights = await this.rightsTo(String(request.params.id), asker, rule);
      if (rule.alsoOf) {
        const others = await this.rightsTo(String(request.params[rule.alsoOf]), asker, rule);
        request.rights = shared(request.rights, others);
      }
      return true;
    }
    if (!asker.viewer) throw notSignedIn();
    if (rule.kind === 'role') this.checkRole(asker.viewer, rule.role);
    return true;
  }

  private async askerOf(request: ViewerRequest): Promise<Asker> {
    const token = accessCookieOf(request);
    return {
      viewer: token ? await this.sessions.findViewer(token) : null,
      shareIds: shareIdsOf(request, this.config.jwtSecret),
    };
  }

  private checkReadOnly(
    { method }: ViewerRequest,
    targets: Parameters<Reflector['getAllAndOverride']>[1],
  ): void {
    const isOpen = this.reflector.getAllAndOverride<true | undefined>(OPEN_TO_READ_ONLY, targets);
    if (!readMethods.has(method) && !isOpen) throw readOnly();
  }

  /** Guests have no account to be held to, and sound comes from the object store: one address can't ask without end. */
  private countGuest(address: string): Promise<void> {
    const limit = this.config.limits.guestReadsPerAddress;
    return this.throttle.count({ key: 'guest', address, limit, windowS: 900 });
  }

  private checkRole(viewer: Viewer, role: Role): void {
    if (!viewer.user.roles.includes(role)) throw forbidden();
  }

  private async rightsTo(takeId: string, asker: Asker, rule: TakeRule): Promise<TakeRights> {
    const { right, alsoDeleted } = rule;
    const rights = await (alsoDeleted
      ? this.access.deletedTake(asker, takeId)
      : this.access.take(asker, takeId));
    const isStranger = !asker.viewer && asker.shareIds.length === 0;
    if (!rights.read) throw isStranger ? notSignedIn() : notFound();
    if (!rights[right]) throw forbidden();
    return rights;
  }
}

const forbidden = () => new AppError('forbidden', 'This is not open to you.');
