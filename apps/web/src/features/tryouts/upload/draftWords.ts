import { countWord } from '../../upload/uploadWords';
import type { TryOutDraft } from './tryOutDraft';

/** The sentence at the head of the page: what is there, and what comes next. */
export function draftWords({ files, pairs, takeIds }: TryOutDraft): { strong: string; rest: string } {
  if (files.some(({ reading }) => reading.kind === 'reading'))
    return { strong: 'Looking at what you dropped.', rest: 'Nothing is sent yet.' };
  if (pairs.length > 0) {
    const gaps = pairs.filter(({ kick, overhead }) => !kick || !overhead).length;
    return {
      strong: pairs.length === 1 ? 'One pair is here.' : `${countWord(pairs.length)} pairs are here.`,
      rest:
        gaps > 0
          ? `${countWord(gaps)} of them ${gaps === 1 ? 'is' : 'are'} not whole yet.`
          : 'Check what belongs together, and write where each stood.',
    };
  }
  if (takeIds.length > 0)
    return { strong: `${countWord(takeIds.length)} takes, one difference.`, rest: 'Write where each stood.' };
  return {
    strong: 'Play the same groove at several positions.',
    rest: 'Then drop all their files here at once.',
  };
}
