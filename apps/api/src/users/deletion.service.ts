import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { DeleteAccountRequest, deletionGraceDays } from '@thudline/contracts';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { OwnPassword } from '../auth/own-password';
import { MailQueue } from '../mail/mail-queue';

const graceMs = deletionGraceDays * 24 * 60 * 60 * 1000;

/** An account that its owner wants gone: everything stays as it is for some days, in which they can change their mind. */
@Injectable()
export class DeletionService {
  constructor(
    private readonly em: EntityManager,
    private readonly ownPassword: OwnPassword,
    private readonly mails: MailQueue,
    private readonly audit: AuditService,
  ) {}

  async ask({ user }: Viewer, { password }: DeleteAccountRequest, address: string): Promise<void> {
    await this.ownPassword.check(user, password);
    if (user.deleteAfter) return;
    await this.em.transactional(async (em) => {
      user.deleteAfter = new Date(Date.now() + graceMs);
      this.audit.record({ kind: 'deletion-asked', userId: user.id, address });
      await em.flush();
      await this.mails.sendWith(em, { kind: 'deletion', userId: user.id });
    });
  }

  /** Safe to call twice. */
  async stop({ user }: Viewer, address: string): Promise<void> {
    if (!user.deleteAfter) return;
    user.deleteAfter = null;
    this.audit.record({ kind: 'deletion-stopped', userId: user.id, address });
    await this.em.flush();
  }
}
