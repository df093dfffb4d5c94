import type { Finding, ReportFigures } from '../report/reportTypes';
import { counted, decimalText } from './words';

/** Only said where samples seem to be missing. A *watch*: what a wave may do by itself is told by common sense, not a norm. */
export function dropoutFindings(figures: ReportFigures): Finding[] {
  return (['kick', 'overhead'] as const).flatMap((role) => {
    const { count, firstAtS } = figures[role].dropouts ?? { count: 0, firstAtS: null };
    if (firstAtS === null) return [];
    const where = `${counted(count, 'place')}, ${count === 1 ? '' : 'the first '}at ${decimalText(firstAtS)} s`;
    return [
      {
        topic: 'dropouts',
        status: 'watch',
        sentence: `The ${role} seems to drop out in ${where}; raise the interface’s buffer size and record again.`,
        why: 'The sound stops or jumps from one sample to the next there, as where samples went missing.',
        next: 'Close other programs, raise the buffer size, and try another cable or port.',
      },
    ];
  });
}
