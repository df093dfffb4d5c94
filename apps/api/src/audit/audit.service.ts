import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { AuditEvent, AuditKind } from './entities/audit-event.entity';

interface Happening {
  kind: AuditKind;
  userId?: string;
  subjectId?: string;
  address?: string;
}

@Injectable()
export class AuditService {
  constructor(private readonly em: EntityManager) {}

  /** Written with the caller's next flush, so that it is told if and only if it happened. */
  record({ kind, userId, subjectId, address }: Happening): void {
    this.em.create(AuditEvent, {
      kind,
      userId: userId ?? null,
      subjectId: subjectId ?? null,
      address: address ?? null,
    });
  }

  /** Written at once, where nothing else is. */
  async write(happening: Happening): Promise<void> {
    this.record(happening);
    await this.em.flush();
  }
}
