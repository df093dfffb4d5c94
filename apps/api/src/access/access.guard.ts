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
import { ACCESS, AccessRule, SubjectKind } from './access.decorator';
import { AccessService } from './access.service';
import { readMethods } from './origin.guard';
import { OPEN_TO_READ_ONLY, readOnly } from './read-only';
import { TakeRights } from './take-rights';
import { Asker, notSignedIn, Viewer, ViewerRequest } from './viewer';

type SubjectRule = Extract<AccessRule, { kind: SubjectKind }>;

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
    request.asker = asker;
    if (isAboutSubject(rule)) {
      if (!asker.viewer) await this.countGuest(request.ip ?? '');
      request.rights = await this.rightsTo(request, asker, rule);
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

  private async rightsTo(request: ViewerRequest, asker: Asker, rule: SubjectRule): Promise<TakeRights> {
    const rights = await this.found(request.params, asker, rule);
    // What may only be heard is not there for whoever wants to read it.
    if (!rights.read && !rights[rule.right]) throw isStranger(asker) ? notSignedIn() : notFound();
    if (!rights[rule.right]) throw forbidden();
    return rights;
  }

  private found(params: ViewerRequest['params'], asker: Asker, { kind }: SubjectRule): Promise<TakeRights> {
    const id = String(params.id);
    switch (kind) {
      case 'take':
        return this.access.take(asker, id);
      case 'deleted-take':
        return this.access.deletedTake(asker, id);
      case 'comparison':
        return this.access.comparison(asker, id, String(params.otherId));
      case 'try-out':
        return this.access.tryOut(asker, id);
      case 'room':
        return this.access.room(asker, String(params.roomId));
    }
  }
}

const isStranger = ({ viewer, shareIds }: Asker) => !viewer && shareIds.length === 0;

const isAboutSubject = (rule: AccessRule): rule is SubjectRule =>
  rule.kind !== 'anyone' && rule.kind !== 'signed-in' && rule.kind !== 'role';

const forbidden = () => new AppError('forbidden', 'This is not open to you.');
