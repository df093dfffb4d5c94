import type { ShareKind, ShareSubject } from '@thudline/contracts';

interface SubjectWords {
  /** "Send this sheet" */
  thing: string;
  /** Of a list of all kinds. */
  kind: string;
  /** What somebody else may do with it, without listening. */
  reading: string;
}

export const subjectWords: Record<ShareKind, SubjectWords> = {
  take: { thing: 'sheet', kind: 'Sheet', reading: 'It opens this sheet and nothing else.' },
  comparison: {
    thing: 'comparison',
    kind: 'Comparison',
    reading: 'It opens this comparison, and neither sheet.',
  },
  'try-out': { thing: 'try-out', kind: 'Try-out', reading: 'It opens this try-out, and none of its sheets.' },
  room: { thing: 'room log', kind: 'Room log', reading: 'It opens this room’s log, and none of its sheets.' },
};

/** Where its owner reads what a link opens. */
export function subjectPath(subject: ShareSubject): string {
  switch (subject.kind) {
    case 'take':
      return `/takes/${subject.takeId}`;
    case 'comparison':
      return `/compare/${subject.takeId}/${subject.otherTakeId}`;
    case 'try-out':
      return `/tryouts/${subject.tryOutId}`;
    case 'room':
      return `/rooms/${subject.roomId}`;
  }
}
