import { defaultUserSettings, UserSettings } from '@thudline/contracts';
import { User } from './entities/user.entity';

/** A person's settings; what was not there yet when the row was written has its default. */
export function settingsOf({ settings }: Pick<User, 'settings'>): UserSettings {
  return { ...defaultUserSettings, ...settings };
}
