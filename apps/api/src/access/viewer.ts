import { createParamDecorator, ExecutionContext } from '@nestjs/common';
import { Request } from 'express';
import { AppError } from '../errors/app-error';
import { User } from '../users/entities/user.entity';
import type { TakeRights } from './take-rights';

/** Somebody signed in. */
export interface Viewer {
  user: User;
  sessionId: string;
  /** A phone that was let in to read along. */
  readOnly: boolean;
}

/** Who asks: somebody signed in or nobody, with the links that their browser has opened. */
export interface Asker {
  viewer: Viewer | null;
  shareIds: string[];
}

export interface ViewerRequest extends Request {
  viewer?: Viewer;
  /** Set by the guard on every route that isn't open to anyone. */
  asker?: Asker;
  /** What may be done with the take, comparison, try-out or room the route is about; set by the guard. */
  rights?: TakeRights;
}

export const notSignedIn = () => new AppError('not-signed-in', 'Sign in to go on.');

export const CurrentViewer = createParamDecorator((_: unknown, context: ExecutionContext): Viewer => {
  const { viewer } = context.switchToHttp().getRequest<ViewerRequest>();
  if (!viewer) throw notSignedIn();
  return viewer;
});

/** For routes that guests may call too. */
export const OptionalViewer = createParamDecorator(
  (_: unknown, context: ExecutionContext): Viewer | null =>
    context.switchToHttp().getRequest<ViewerRequest>().viewer ?? null,
);

/** For routes that declare a right to a take, a comparison, a try-out or a room. */
export const CurrentRights = createParamDecorator((_: unknown, context: ExecutionContext): TakeRights => {
  const { rights } = context.switchToHttp().getRequest<ViewerRequest>();
  if (!rights) throw new Error('This route declares no right to anything.');
  return rights;
});
