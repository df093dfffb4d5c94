import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { UpdateMeRequest } from '@thudline/contracts';
import { ReportsService } from '../reports/reports.service';
import { User } from './entities/user.entity';
import { settingsOf } from './user-settings';

@Injectable()
export class MeService {
  constructor(
    private readonly em: EntityManager,
    private readonly reports: ReportsService,
  ) {}

  /** What is named changes, the rest stays. Sheets follow at once: they are judged on reading. */
  async update(user: User, { name, settings }: UpdateMeRequest): Promise<void> {
    if (name !== undefined) user.name = name;
    if (settings !== undefined) user.settings = { ...settingsOf(user), ...settings };
    await this.em.flush();
    if (settings?.target) await this.reports.tellAnew(user);
  }
}
