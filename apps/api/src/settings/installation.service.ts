import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { InstallationSettings, installationSettings, UpdateInstallationRequest } from '@thudline/contracts';
import { Setting, SettingKey } from './entities/setting.entity';

/** Where nobody has decided. About a thousand takes of a minute; a guess, no source. */
const usual: InstallationSettings = { accountBytes: 20_000_000_000, signUp: 'open' };

const keys = { accountBytes: 'account-bytes', signUp: 'sign-up' } as const satisfies Record<
  keyof InstallationSettings,
  SettingKey
>;
const fields = Object.keys(keys) as (keyof InstallationSettings)[];

/** What whoever runs the installation has decided; read each time, so that it holds at once in every process. */
@Injectable()
export class InstallationService {
  constructor(private readonly em: EntityManager) {}

  async get(): Promise<InstallationSettings> {
    const rows = await this.em.fork().find(Setting, { key: { $in: Object.values(keys) } });
    const written = new Map(rows.map(({ key, value }) => [key, JSON.parse(value) as unknown]));
    const told = fields.map((field) => [field, written.get(keys[field]) ?? usual[field]]);
    return installationSettings.parse(Object.fromEntries(told));
  }

  async update(changes: UpdateInstallationRequest): Promise<void> {
    for (const field of fields) {
      const value = changes[field];
      if (value !== undefined)
        await this.em.upsert(Setting, { key: keys[field], value: JSON.stringify(value) });
    }
  }
}
