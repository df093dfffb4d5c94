import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { Note } from '../notes/entities/note.entity';
import { ReportsService } from '../reports/reports.service';
import { RoomChange } from '../rooms/entities/room-change.entity';
import { Share } from '../shares/entities/share.entity';
import { Take } from '../takes/entities/take.entity';
import { isClosed } from '../users/closed-account';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { ChosenMail } from './chosen-mail';
import { MailJob } from './mail-jobs';
import { digestMail, Week } from './templates/digest-mail';
import { weekMs } from './week';

/** What changed in a week, in one mail; nothing where nothing did. */
@Injectable()
export class DigestMailWriter {
  constructor(
    private readonly em: EntityManager,
    private readonly mail: ChosenMail,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async write({ userId, until }: Extract<MailJob, { kind: 'digest' }>): Promise<void> {
    const em = this.em.fork();
    const user = await em.findOne(User, userId);
    if (!user || isClosed(user)) return;
    const end = new Date(until);
    const week = await weekOf(em, user, { $gte: new Date(end.getTime() - weekMs), $lt: end });
    if (week.takes.length + week.notes + week.opened + week.changes.length === 0) return;
    const url = new URL('/takes', this.config.publicUrl).href;
    await this.mail.toUser(user, 'digest', digestMail({ name: user.name, week, url }));
  }
}

async function weekOf(em: EntityManager, user: User, during: { $gte: Date; $lt: Date }): Promise<Week> {
  const [takes, opened, changes, notes] = await Promise.all([
    em.find(Take, { owner: user, createdAt: during, deletedAt: null }, { orderBy: { number: 'asc' } }),
    em.count(Share, { owner: user, openedAt: during }),
    em.find(RoomChange, { room: { owner: user }, createdAt: during }, { populate: ['room'] }),
    em.count(Note, {
      take: { owner: user, deletedAt: null },
      $or: [{ author: null }, { author: { $ne: user } }],
      createdAt: during,
      deletedAt: null,
    }),
  ]);
  const reportIds = takes.flatMap(({ currentReportId }) => currentReportId ?? []);
  const figures = await new ReportsService(em).listFigures(reportIds, settingsOf(user));
  return {
    takes: takes.map(({ number, title, currentReportId }) => ({
      number,
      title,
      summary: figures.get(currentReportId ?? '')?.summary ?? null,
    })),
    notes,
    opened,
    changes: changes.map(({ what, room }) => ({ what, room: room.unwrap().name })),
  };
}
