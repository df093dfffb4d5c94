import type { Arrangement } from './arrangement';
import { aboutTimeLeft, countWord } from './uploadWords';
import type { Sending } from './uploadState';

export interface HeadlineWords {
  strong: string;
  rest: string;
}

interface Facts {
  arranged: Arrangement;
  sending: Sending;
  /** Until the last byte is there; null when it can't be told yet. */
  secondsLeft: number | null;
  pickedCount: number;
}

/** The sentence at the top of the upload page: what is so, and what comes next. */
export function headline(facts: Facts): HeadlineWords {
  switch (facts.sending.phase) {
    case 'sending':
      return sendingWords(facts);
    case 'arrived':
      return { strong: 'The take is kept.', rest: 'Its sheet opens now.' };
    case 'stopped':
      return {
        strong: 'Stopped.',
        rest: facts.sending.allSent
          ? 'The files had arrived already: look under Takes, or send them again.'
          : 'Nothing was kept. Send it again whenever you like.',
      };
    case 'lost':
      return { strong: 'The connection was lost.', rest: 'Send it again: a take is never kept twice.' };
    case 'refused':
      return { strong: 'This take was not kept.', rest: 'Below it says why.' };
    case 'choosing':
      return choosingWords(facts.arranged);
  }
}

function sendingWords({ arranged, secondsLeft, pickedCount }: Facts): HeadlineWords {
  const count = arranged.used.length;
  if (secondsLeft === 0) {
    return {
      strong: count === 1 ? 'The file has arrived.' : 'Both files have arrived.',
      rest: count === 1 ? 'It is being checked and kept.' : 'They are being checked and kept.',
    };
  }
  const which =
    pickedCount > count
      ? `${countWord(count)} of ${countWord(pickedCount).toLowerCase()} files`
      : `${countWord(count)} ${count === 1 ? 'file' : 'files'}`;
  return {
    strong: `${which} ${count === 1 ? 'is on its way.' : 'are on their way.'}`,
    rest: aboutTimeLeft(secondsLeft),
  };
}

function choosingWords({ kind, ratesDiffer, reading, slots }: Arrangement): HeadlineWords {
  if (ratesDiffer) {
    return { strong: 'These two don’t belong together.', rest: 'Both files must come from one session.' };
  }
  if (kind === 'pair')
    return { strong: 'Both files are here.', rest: 'Check which is which, then measure them.' };
  if (kind === 'stereo')
    return { strong: 'One stereo file is here.', rest: 'Check which side is which, then measure it.' };
  if (reading) return { strong: 'Looking at what you dropped.', rest: 'Nothing is sent yet.' };
  if (kind === 'one-of-two') {
    const missing = slots[0].role === 'kick' ? 'overhead' : 'kick';
    return { strong: `Now the ${missing} file.`, rest: `The ${slots[0].role} is here.` };
  }
  return {
    strong: 'Drop in a kick file and an overhead file.',
    rest: 'Recorded together.',
  };
}

/** Why a take can't be sent yet, for whoever tries. */
export function whyNotYet({ kind, ratesDiffer, reading, slots }: Arrangement): string {
  if (reading) return 'One moment: the files are still being looked at.';
  if (ratesDiffer)
    return 'Both files must come from one session. Export one of them again at the other’s rate.';
  if (kind === 'one-of-two') return `Add the ${slots[0].role === 'kick' ? 'overhead' : 'kick'} file first.`;
  return 'Add a kick file and an overhead file first.';
}
