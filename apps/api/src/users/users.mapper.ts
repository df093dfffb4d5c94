import { MeResponse } from '@thudline/contracts';
import { User } from './entities/user.entity';
import { settingsOf } from './user-settings';

/** @param readOnly - true on a phone that was let in to read along */
export function meResponseOf(user: User, { readOnly }: { readOnly: boolean }): MeResponse {
  const { id, name, email, emailVerifiedAt, roles } = user;
  return {
    id,
    name,
    email,
    emailVerified: emailVerifiedAt != null,
    roles,
    settings: settingsOf(user),
    readOnly,
    deleteAfter: user.deleteAfter?.toISOString() ?? null,
  };
}
