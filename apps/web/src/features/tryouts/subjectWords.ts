import type { TryOutSubject } from '@thudline/contracts';

interface SubjectWords {
  /** "how high the overhead hangs" */
  differs: string;
  /** Heads the column of positions. */
  column: string;
  /** Under the axis: what the number counts from. */
  from: string;
  /** "Raise the overhead to 100 cm": more, less, the same, and where it isn't known what stands now. */
  more: string;
  less: string;
  stay: string;
  put: string;
}

const subjects: Record<Exclude<TryOutSubject, 'other'>, SubjectWords> = {
  'overhead-height': {
    differs: 'how high the overhead hangs',
    column: 'Overhead at',
    from: 'above the snare',
    more: 'Raise the overhead to',
    less: 'Lower the overhead to',
    stay: 'Leave the overhead at',
    put: 'Hang the overhead at',
  },
  'overhead-forward': {
    differs: 'how far the overhead hangs toward the kick',
    column: 'Overhead at',
    from: 'from the snare toward the kick',
    more: 'Move the overhead toward the kick to',
    less: 'Move the overhead back to',
    stay: 'Leave the overhead at',
    put: 'Hang the overhead at',
  },
  'kick-depth': {
    differs: 'how deep the kick microphone stands',
    column: 'Kick at',
    from: 'inside the front hole',
    more: 'Move the kick microphone in to',
    less: 'Move the kick microphone out to',
    stay: 'Leave the kick microphone at',
    put: 'Put the kick microphone at',
  },
  'kick-angle': {
    differs: 'how far the kick microphone is turned away',
    column: 'Kick at',
    from: 'turned away',
    more: 'Turn the kick microphone further, to',
    less: 'Turn the kick microphone back to',
    stay: 'Leave the kick microphone at',
    put: 'Turn the kick microphone to',
  },
};

/** What a try-out is about, in words. */
export function subjectWords({
  subject,
  differs,
}: {
  subject: TryOutSubject;
  differs: string;
}): SubjectWords {
  if (subject !== 'other') return subjects[subject];
  const head = differs.charAt(0).toUpperCase() + differs.slice(1);
  return { differs, column: head, from: '', more: 'Go to', less: 'Go to', stay: 'Stay with', put: 'Take' };
}

/** For choosing one. */
export const subjectChoice = (subject: TryOutSubject): string =>
  subject === 'other' ? 'something else' : subjects[subject].differs;
