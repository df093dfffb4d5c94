import type { Finding, ReportFigures } from '../report/reportTypes';

/** Only said of what isn't called clipped anyway, and never called clipped itself. */
export function flattenedFindings(figures: ReportFigures): Finding[] {
  return (['kick', 'overhead'] as const).flatMap((role) => {
    const { looksFlattened, level } = figures[role];
    if (looksFlattened !== true || level === 'clipped') return [];
    return [
      {
        topic: 'flattened',
        status: 'watch',
        sentence: `The loudest ${role} peaks look squashed below full scale; listen to them, switch off any limiter, or turn the ${role} preamp down.`,
        why: 'Several of the loudest waves are cut straighter than a drum’s own wave would be.',
        next: `Play the hardest hits again with the ${role} preamp 6 dB lower, and compare.`,
      },
    ];
  });
}
