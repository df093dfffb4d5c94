import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { ComplaintResponse, CreateComplaintRequest, ListComplaintsResponse } from '@thudline/contracts';
import { validate } from 'uuid';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { notFound } from '../errors/app-error';
import { NoteReader } from '../notes/note-reader';
import { NotesService } from '../notes/notes.service';
import { ThrottleService } from '../throttle/throttle.service';
import { Complaint } from './entities/complaint.entity';

const mostListed = 200;

/** What people say is wrong with notes and sheets, for whoever runs the installation. */
@Injectable()
export class ComplaintsService {
  constructor(
    private readonly em: EntityManager,
    private readonly notes: NotesService,
    private readonly throttle: ThrottleService,
    private readonly audit: AuditService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async create(
    reader: NoteReader,
    { noteId, reason }: CreateComplaintRequest,
    address: string,
  ): Promise<void> {
    const limit = this.config.limits.complaintsPerAddress;
    await this.throttle.count({ key: 'complaint', address, limit, windowS: 3_600 });
    const note = noteId === undefined ? null : await this.notes.getReadable(reader, noteId);
    const complaint = this.em.create(Complaint, {
      take: reader.takeId,
      note,
      reporter: reader.userId,
      reason,
    });
    const userId = reader.userId ?? undefined;
    await this.em.flush();
    this.audit.record({ kind: 'complaint-made', userId, subjectId: complaint.id, address });
    await this.em.flush();
  }

  /** What nobody has looked at first, then from new to old. */
  async list(): Promise<ListComplaintsResponse> {
    const found = await this.em.find(
      Complaint,
      { take: { deletedAt: null } },
      {
        orderBy: [{ settledAt: 'desc nulls first' }, { id: 'desc' }],
        limit: mostListed,
        populate: ['take.owner', 'note.author', 'reporter'],
      },
    );
    return { items: found.map(complaintResponseOf) };
  }

  /** Safe to call twice. */
  async settle(
    { user }: Viewer,
    complaintId: string,
    { removeNote }: { removeNote: boolean },
  ): Promise<void> {
    const found = validate(complaintId)
      ? await this.em.findOne(Complaint, { id: complaintId }, { populate: ['note'] })
      : null;
    if (!found) throw notFound();
    found.settledAt ??= new Date();
    const note = found.note?.unwrap();
    // One that its writer took away stays away, too.
    if (note && removeNote)
      Object.assign(note, { deletedAt: note.deletedAt ?? new Date(), removedBy: 'admin' });
    this.audit.record({ kind: 'complaint-settled', userId: user.id, subjectId: found.id });
    await this.em.flush();
  }
}

function complaintResponseOf(complaint: Complaint): ComplaintResponse {
  const take = complaint.take.unwrap();
  const note = complaint.note?.unwrap();
  return {
    id: complaint.id,
    createdAt: complaint.createdAt.toISOString(),
    reason: complaint.reason,
    from: complaint.reporter?.unwrap().name ?? null,
    take: { id: take.id, number: take.number, player: take.owner.unwrap().name },
    note: note
      ? {
          id: note.id,
          name: note.author?.unwrap().name ?? note.guestName ?? null,
          body: note.body,
          isRemoved: note.deletedAt != null,
        }
      : null,
    settledAt: complaint.settledAt?.toISOString() ?? null,
  };
}
