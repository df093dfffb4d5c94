import { createParamDecorator, ExecutionContext } from '@nestjs/common';
import { Request } from 'express';
import { AppError } from '../errors/app-error';
import { User } from '../users/entities/user.entity';

/** Who asks: a user, and later the grants of shares they opened. */
export interface Viewer {
  user: User;
  sessionId: string;
}

export interface ViewerRequest extends Request {
  viewer?: Viewer;
}

export const notSignedIn = () => new AppError('not-signed-in', 'Sign in to go on.');

export const CurrentViewer = createParamDecorator((_: unknown, context: ExecutionContext): Viewer => {
  const { viewer } = context.switchToHttp().getRequest<ViewerRequest>();
  if (!viewer) throw notSignedIn();
  return viewer;
});
