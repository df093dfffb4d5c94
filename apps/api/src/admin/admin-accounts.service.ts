import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import {
  AccountResponse,
  InviteRequest,
  ListAccountsRequest,
  ListAccountsResponse,
  UpdateAccountRequest,
} from '@thudline/contracts';
import { validate } from 'uuid';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { AuditKind } from '../audit/entities/audit-event.entity';
import { emailTaken } from '../auth/auth.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError, notFound } from '../errors/app-error';
import { MailQueue } from '../mail/mail-queue';
import { ThrottleService } from '../throttle/throttle.service';
import { User } from '../users/entities/user.entity';
import {
  accountQuery,
  accountResponseOf,
  AccountRow,
  accountsAtOnce,
  accountsCount,
  accountsQuery,
} from './admin-accounts.query';

const everyByte = `
  select ((select coalesce(sum(bytes), 0) from take_file) + (select coalesce(sum(bytes), 0) from added_file)
    + (select coalesce(sum(bytes), 0) from photo))::float8 as bytes`;

/** Whoever has an account here, as whoever runs the installation sees them. */
@Injectable()
export class AdminAccountsService {
  constructor(
    private readonly em: EntityManager,
    private readonly mails: MailQueue,
    private readonly audit: AuditService,
    private readonly throttle: ThrottleService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async list(request: ListAccountsRequest): Promise<ListAccountsResponse> {
    const [rows, [count], [all]] = await Promise.all([
      this.rows<AccountRow>(accountsQuery(request)),
      this.rows<{ total: number }>(accountsCount(request)),
      this.rows<{ bytes: number }>({ text: everyByte, values: [] }),
    ]);
    const page = rows.slice(0, accountsAtOnce);
    return {
      items: page.map(accountResponseOf),
      next: rows.length > accountsAtOnce ? (page.at(-1)?.id ?? null) : null,
      total: count?.total ?? 0,
      bytes: all?.bytes ?? 0,
    };
  }

  /** @throws {AppError} `conflict` where an admin would shut themselves out */
  async update(viewer: Viewer, userId: string, changes: UpdateAccountRequest): Promise<AccountResponse> {
    const user = await this.get(userId);
    const { roles, locked, quotaBytes } = changes;
    if (user.id === viewer.user.id && (locked || (roles && !roles.includes('admin')))) throw shutOut();
    const record = (kind: AuditKind) =>
      this.audit.record({ kind, userId: viewer.user.id, subjectId: user.id });
    if (roles) {
      user.roles = [...new Set(['player' as const, ...roles])];
      record('roles-changed');
    }
    if (locked !== undefined && locked !== (user.lockedAt != null)) {
      user.lockedAt = locked ? new Date() : null;
      record(locked ? 'account-locked' : 'account-unlocked');
    }
    if (quotaBytes !== undefined) {
      user.quotaBytes = quotaBytes;
      record('quota-changed');
    }
    await this.em.flush();
    const [row] = await this.rows<AccountRow>(accountQuery(user.id));
    if (!row) throw notFound();
    return accountResponseOf(row);
  }

  async resendVerification(userId: string): Promise<void> {
    const user = await this.get(userId);
    const limit = this.config.limits.mailsPerAccount;
    await this.throttle.count({ key: `verify-mail:${user.id}`, limit, windowS: 3_600 });
    if (!user.emailVerifiedAt) await this.mails.send({ kind: 'verify', userId: user.id });
  }

  /** Works whether joining needs an invitation or not. */
  async invite({ user }: Viewer, { email }: InviteRequest): Promise<void> {
    const limit = this.config.limits.mailsPerAddress;
    await this.throttle.count({ key: `invite:${user.id}`, limit, windowS: 3_600 });
    if ((await this.em.count(User, { emailLower: email.toLowerCase() })) > 0) throw emailTaken();
    await this.em.transactional(async (em) => {
      this.audit.record({ kind: 'account-invited', userId: user.id });
      await em.flush();
      await this.mails.sendWith(em, { kind: 'join-invitation', email, fromUserId: user.id });
    });
  }

  private async get(userId: string): Promise<User> {
    const user = validate(userId) ? await this.em.findOne(User, { id: userId }) : null;
    if (!user) throw notFound();
    return user;
  }

  private rows<Row>({ text, values }: { text: string; values: unknown[] }): Promise<Row[]> {
    return this.em.getConnection().execute<Row[]>(text, values);
  }
}

const shutOut = () => new AppError('conflict', 'You would shut yourself out. Another admin can do that.');
