import { MeResponse } from '@thudline/contracts';
import { User } from './entities/user.entity';

export function meResponseOf({ id, name, email, roles, settings }: User): MeResponse {
  return { id, name, email, roles, settings };
}
