import type { HumFacts } from '../facts';
import type { Finding, ReportFigures } from '../report/reportTypes';
import { wholeDbfsText } from './words';

/** A tone is heard below noise of the same level, so hum is told from 10 dB below where noise is a *watch*. Our choice. */
const HUM_WATCH_DBFS = -70;

export interface LoudHum extends HumFacts {
  readonly role: 'kick' | 'overhead';
}

/** @returns the louder hum of the two microphones where it is loud enough to matter; null where nothing is */
export function loudHum(figures: ReportFigures): LoudHum | null {
  const hums = (['overhead', 'kick'] as const).flatMap((role) => {
    const { hum } = figures[role];
    return hum && hum.levelDbfs > HUM_WATCH_DBFS ? [{ role, ...hum }] : [];
  });
  return hums.sort((a, b) => b.levelDbfs - a.levelDbfs).at(0) ?? null;
}

/** Only said where something hums. */
export function humFindings(figures: ReportFigures): Finding[] {
  const hum = loudHum(figures);
  if (!hum) return [];
  const level = wholeDbfsText(hum.levelDbfs);
  return [
    {
      topic: 'hum',
      status: 'watch',
      sentence: `Mains hum sits at ${level} dBFS in the ${hum.role} and rises with any gain; try another cable or outlet, and keep the safety earth.`,
      why: `In the quiet stretch, multiples of ${hum.mainsHz} Hz stand out: a cable, a power supply or a dimmer lets the mains in.`,
      next: 'Move cables away from power supplies, switch dimmers off, never lift a safety earth, and record silence again.',
    },
  ];
}
