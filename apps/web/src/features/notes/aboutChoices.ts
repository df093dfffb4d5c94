import type { NotePin, ReportResponse } from '@thudline/contracts';
import { mainTopic, noteSections, sectionOf, type NoteSection } from './noteOrder';
import { pinWords } from './noteWords';

export interface AboutChoice {
  /** Distinct among the choices. */
  key: string;
  words: string;
  pin: NotePin;
}

/** Whether a sheet has this stretch, with something in it to pin a note to. */
export function hasSection(report: ReportResponse, section: NoteSection): boolean {
  if (section === 'whole-take') return true;
  // A take measured before they were has none of them.
  if (section === 'drums') return report.balance !== null;
  if (section === 'room') return report.room !== null;
  return report.findings.some(({ topic }) => sectionOf({ kind: 'finding', topic }) === section);
}

/** What a note can be about: the take, each section, the chosen hit, and the moment where the take stands. */
export function aboutChoices(
  report: ReportResponse,
  { hitS, playedS, pin }: { hitS: number | null; playedS: number; pin?: NotePin },
): AboutChoice[] {
  const pins: NotePin[] = [
    { kind: 'take' },
    ...noteSections.flatMap((section): NotePin[] =>
      section !== 'whole-take' && hasSection(report, section)
        ? [{ kind: 'finding', topic: mainTopic[section] }]
        : [],
    ),
    ...(hitS === null ? [] : [{ kind: 'hit', timeS: hitS } as const]),
    ...(playedS > 0 ? [{ kind: 'time', timeS: Math.min(playedS, report.durationS) } as const] : []),
    ...(pin ? [pin] : []),
  ];
  const choices = pins.map((each) => ({
    key: keyOf(each),
    words: pinWords(each, report) || 'the whole take',
    pin: each,
  }));
  return choices.filter(({ key }, i) => choices.findIndex((other) => other.key === key) === i);
}

export const keyOf = (pin: NotePin): string =>
  pin.kind === 'finding' ? pin.topic : 'timeS' in pin ? `${pin.kind}:${pin.timeS.toFixed(3)}` : pin.kind;
