import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { AuditEntry, ListAuditRequest, ListAuditResponse } from '@thudline/contracts';
import { AuditEvent } from '../audit/entities/audit-event.entity';
import { User } from '../users/entities/user.entity';

const atOnce = 100;

/** What happened here, newest first. */
@Injectable()
export class AdminAuditService {
  constructor(private readonly em: EntityManager) {}

  async list({ after, account }: ListAuditRequest): Promise<ListAuditResponse> {
    const of = account ? { $or: [{ userId: account }, { subjectId: account }] } : {};
    const rows = await this.em.find(
      AuditEvent,
      { ...of, ...(after ? { id: { $lt: after } } : {}) },
      { orderBy: { id: 'desc' }, limit: atOnce + 1 },
    );
    const page = rows.slice(0, atOnce);
    const names = await this.namesOf(page);
    return {
      items: page.map((event) => entryOf(event, names)),
      next: rows.length > atOnce ? (page.at(-1)?.id ?? null) : null,
    };
  }

  private async namesOf(events: AuditEvent[]): Promise<Map<string, string>> {
    const ids = events.flatMap(({ userId, subjectId }) => [userId, subjectId]).filter((id) => id != null);
    const users = await this.em.find(User, { id: { $in: [...new Set(ids)] } });
    return new Map(users.map(({ id, name }) => [id, name]));
  }
}

function entryOf(event: AuditEvent, names: Map<string, string>): AuditEntry {
  const named = (id: string | null | undefined) => {
    const name = id ? names.get(id) : undefined;
    return id && name !== undefined ? { id, name } : null;
  };
  return {
    id: event.id,
    at: event.createdAt.toISOString(),
    kind: event.kind,
    account: named(event.userId),
    subject: named(event.subjectId),
    address: event.address ?? null,
  };
}
