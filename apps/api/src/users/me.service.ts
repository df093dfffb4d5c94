import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { UpdateMeRequest, UserSettings } from '@thudline/contracts';
import { ReportTelling } from '../reports/report-telling';
import { User } from './entities/user.entity';

/** What the words of a sheet depend on, see `toldColumns`. */
const toldBySheets = ['target', 'temperatureC', 'lengthUnit'] as const;

@Injectable()
export class MeService {
  constructor(
    private readonly em: EntityManager,
    private readonly telling: ReportTelling,
  ) {}

  /** What is named changes, the rest stays. Sheets follow at once: they are judged on reading. */
  async update(user: User, { name, settings }: UpdateMeRequest): Promise<void> {
    if (name !== undefined) user.name = name;
    await this.em.flush();
    if (!settings) return;
    await this.merge(user, settings);
    if (toldBySheets.some((key) => settings[key] !== undefined)) await this.telling.tellAnew(user);
  }

  /** By the database, so that two tabs that change different settings at the same moment keep both. */
  private async merge(user: User, settings: Partial<UserSettings>): Promise<void> {
    const merged = 'update "user" set settings = settings || ?::jsonb where id = ?';
    await this.em.getConnection().execute(merged, [JSON.stringify(settings), user.id]);
    await this.em.refresh(user);
  }
}
