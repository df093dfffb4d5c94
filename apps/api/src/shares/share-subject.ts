import { FilterQuery } from '@mikro-orm/postgresql';
import { ShareSubject } from '@thudline/contracts';
import { Share } from './entities/share.entity';

interface SubjectColumns {
  take: string | null;
  otherTake: string | null;
  tryOut: string | null;
  room: string | null;
}

const none: SubjectColumns = { take: null, otherTake: null, tryOut: null, room: null };

/** Where a subject stands in a row: exactly one of take, try-out and room is filled. */
export function subjectColumns(subject: ShareSubject): SubjectColumns {
  switch (subject.kind) {
    case 'take':
      return { ...none, take: subject.takeId };
    case 'comparison':
      return { ...none, take: subject.takeId, otherTake: subject.otherTakeId };
    case 'try-out':
      return { ...none, tryOut: subject.tryOutId };
    case 'room':
      return { ...none, room: subject.roomId };
  }
}

export const isAbout = (subject: ShareSubject): FilterQuery<Share> => ({ ...subjectColumns(subject) });

export function subjectOf({ take, otherTake, tryOut, room }: Share): ShareSubject {
  if (take && otherTake) return { kind: 'comparison', takeId: take.id, otherTakeId: otherTake.id };
  if (take) return { kind: 'take', takeId: take.id };
  if (tryOut) return { kind: 'try-out', tryOutId: tryOut.id };
  if (room) return { kind: 'room', roomId: room.id };
  throw new Error('A share without a subject; the database has a check against it.');
}
