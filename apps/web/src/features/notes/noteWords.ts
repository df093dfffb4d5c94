import type { NotePin, NoteResponse, ReportResponse } from '@thudline/contracts';
import { clock } from '../../lib/format';
import { kickHitsOf, loudestHit } from '../sheet/kickHits';
import { sectionOf, sectionTitles } from './noteOrder';

/** A hit found again by another version of the measurements lies within this; hits lie further apart than that. */
const sameHitS = 0.03;

/** What a note speaks of: "loudest kick, 0:04.3", "Adding up"; nothing for the take as a whole. */
export function pinWords(pin: NotePin, report: ReportResponse): string {
  if (pin.kind === 'take') return '';
  if (pin.kind === 'time') return clock(pin.timeS, true);
  if (pin.kind === 'hit') return `${hitWords(pin.timeS, report)}, ${clock(pin.timeS, true)}`;
  const section = sectionOf(pin);
  return section ? sectionTitles[section] : '';
}

function hitWords(timeS: number, report: ReportResponse): string {
  const kicks = kickHitsOf(report);
  const index = kicks.find((each) => Math.abs(report.hits[each].timeS - timeS) <= sameHitS);
  if (index === undefined) return 'a hit';
  return index === loudestHit(report, kicks) ? 'loudest kick' : `kick hit ${kicks.indexOf(index) + 1}`;
}

/** Whoever wrote it; a guest's name is their own choice, so it says that they are a guest. */
export function writerWords({ name, as }: NoteResponse['from']): string {
  if (name === null) return 'Somebody who has left';
  return as === 'guest' ? `${name}, by link` : name;
}
