import { SetMetadata } from '@nestjs/common';

export const FROM_ANYWHERE = Symbol('from anywhere');

/** A route that writes and may be called from no page of ours: it acts on no cookie, only on a token it is given. */
export const FromAnywhere = () => SetMetadata(FROM_ANYWHERE, true);
