import { createParamDecorator, ExecutionContext } from '@nestjs/common';
import { TakeRights } from '../access/take-rights';
import { Asker, notSignedIn, ViewerRequest } from '../access/viewer';

/** A request about the notes on the take of `:id`, whose rights the guard has found. */
export interface Asked {
  takeId: string;
  asker: Asker;
  rights: TakeRights;
  request: ViewerRequest;
}

export const CurrentAsked = createParamDecorator((_: unknown, context: ExecutionContext): Asked => {
  const request = context.switchToHttp().getRequest<ViewerRequest>();
  const { asker, rights } = request;
  if (!asker || !rights) throw notSignedIn();
  return { takeId: String(request.params.id), asker, rights, request };
});
