import type { Finding, ReportFigures } from '../report/reportTypes';
import { decimalText } from './words';

/** Only a float file holds samples beyond full scale; unless their tops are flat, nothing is lost. */
export function oversFindings(figures: ReportFigures): Finding[] {
  return (['kick', 'overhead'] as const).flatMap((role) => {
    const { samplePeakDbfs, level } = figures[role];
    // A twentieth of a decibel is what the sentence would round to nothing.
    if (samplePeakDbfs === null || samplePeakDbfs < 0.05 || level === 'clipped') return [];
    const overDb = decimalText(samplePeakDbfs);
    return [
      {
        topic: 'overs',
        status: 'watch',
        sentence: `The ${role} goes ${overDb} dB over full scale, unharmed in a float file; turn it down ${overDb} dB before saving it as 24-bit.`,
        why: 'A float file holds louder samples as they are. Every other format, and every converter, cuts them off.',
        next: 'Turn it down in the project before it is exported or played.',
      },
    ];
  });
}
