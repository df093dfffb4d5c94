import type { Finding, ReportFigures } from '../report/reportTypes';
import { wholeMsText } from './words';

/** Only said where the two files don't start together; the take itself is good, so it is a *fix* that needs no retake. */
export function lateStartFindings({ lateStart }: ReportFigures): Finding[] {
  if (!lateStart) return [];
  const { overheadLateMs } = lateStart;
  const [runs, play] = overheadLateMs > 0 ? ['late', 'earlier'] : ['early', 'later'];
  const by = wholeMsText(overheadLateMs);
  return [
    {
      topic: 'late-start',
      status: 'fix',
      sentence: `The overhead file runs ${by} ${runs} against the kick file; play it ${by} ${play}, then export both from the same start.`,
      why: 'The same kicks stand in both files, moved by that much, to within 5 ms; no microphone stands so far away.',
      next: `In the recording program move the overhead ${by} ${play} and check one kick by eye. No retake needed.`,
    },
  ];
}
