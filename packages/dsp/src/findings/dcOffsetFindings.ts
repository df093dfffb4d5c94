import { amplitudeDb } from '../decibel';
import type { Finding, ReportFigures } from '../report/reportTypes';
import { wholeDbfsText } from './words';

/** docs/measurements.md, 2: *watch* above −60 dBFS. */
const WATCH_DBFS = -60;

/** Only said where a file is off its centre: that it isn't is nothing to read about. */
export function dcOffsetFindings(figures: ReportFigures): Finding[] {
  return (['kick', 'overhead'] as const).flatMap((role) => {
    const offsetDbfs = amplitudeDb(figures[role].dcOffset);
    if (offsetDbfs === null || offsetDbfs <= WATCH_DBFS) return [];
    return [
      {
        topic: 'dc-offset',
        status: 'watch',
        sentence: `The ${role} wave sits off its centre by ${wholeDbfsText(offsetDbfs)} dBFS, which costs room on one side; try another input or cable.`,
        why: 'An offset carries no sound, uses up headroom and clicks at every cut.',
        next: 'Try another input. On this take a low cut at 20 Hz removes it.',
      },
    ];
  });
}
