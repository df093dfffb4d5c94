import { CanActivate, ExecutionContext, Inject, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { appHeader } from '@thudline/contracts';
import { Request } from 'express';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { FROM_ANYWHERE } from './from-anywhere';

export const readMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Writes come from our own pages: they carry the app's header and an Origin equal to PUBLIC_URL. */
@Injectable()
export class OriginGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (readMethods.has(request.method)) return true;
    if (this.reflector.get<true | undefined>(FROM_ANYWHERE, context.getHandler())) return true;
    const hasHeader = request.get(appHeader.name) === appHeader.value;
    if (hasHeader && request.get('Origin') === this.config.publicOrigin) return true;
    throw new AppError('forbidden', 'This request did not come from a page of this site.');
  }
}
