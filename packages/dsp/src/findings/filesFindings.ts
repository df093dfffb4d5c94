import type { FileNotice } from '../facts';
import type { Finding } from '../report/reportTypes';
import { decimalText } from './words';

/** What was odd about the files themselves; nothing is said of files that are as they should be. */
export function filesFindings(notices: readonly FileNotice[]): Finding[] {
  return notices.map((notice) => ({ topic: 'files', status: 'watch', ...said(notice) }));
}

function said(notice: FileNotice): Pick<Finding, 'sentence' | 'why' | 'next'> {
  switch (notice.kind) {
    case 'lengths-differ':
      return {
        sentence: `One file is ${secondsText(notice.byS)} longer than the other, so only the length they share was measured.`,
        why: 'What one microphone alone holds can’t be compared.',
        next: 'Export both files with the same start and end.',
      };
    case 'same-file-twice':
      return {
        sentence:
          'Kick and overhead are the same recording twice, so how they add says nothing; check which files you chose.',
        why: 'Sample for sample there is no difference between them.',
        next: 'Add the take again with the two microphones’ own files.',
      };
    case 'unrelated-files':
      return {
        sentence:
          'The two files don’t seem to belong together: nothing in them lines up; check that both come from one take.',
        why: 'No kick hit is followed by the same sound in the overhead.',
        next: 'Add the take again with two files that were recorded together.',
      };
    case 'cut-short':
      return {
        sentence: `The ${notice.role} file ends earlier than its header says; it was measured as far as it goes.`,
        why: 'The recording or the copy was interrupted.',
        next: 'Export the file again if the end matters.',
      };
    case 'silent':
      return {
        sentence: `The ${notice.role} file is silent, so nothing can be said about it; check cable, input and export.`,
        why: 'Every sample is zero.',
        next: 'Record a few hits and look for a level before the next take.',
      };
  }
}

const MS_BELOW_S = 1;

function secondsText(seconds: number): string {
  return seconds < MS_BELOW_S ? `${Math.max(1, Math.round(seconds * 1000))} ms` : `${decimalText(seconds)} s`;
}
