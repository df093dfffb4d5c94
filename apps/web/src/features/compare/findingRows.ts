import type { ComparisonResponse, Finding, ReportResponse } from '@thudline/contracts';
import {
  addingUpTopics,
  balanceTopics,
  balanceWord,
  levelsWord,
  roomTopics,
  roomWord,
  severity,
  verdictWord,
} from '../sheet/components/sectionWords';

export interface SaidSide {
  word: string;
  finding: Finding;
}

interface FindingRow {
  title: string;
  before: SaidSide | null;
  after: SaidSide | null;
}

interface Section {
  title: string;
  topics: readonly Finding['topic'][];
  word: (report: ReportResponse, worst: Finding) => string;
}

const noiseWords = { good: 'quiet', watch: 'noisy', fix: 'noisy', 'cannot-tell': 'can’t tell' } as const;

const sections: Section[] = [
  { title: 'Levels', topics: ['kick-level', 'overhead-level'], word: levelsWord },
  { title: 'Adding up', topics: addingUpTopics, word: verdictWord },
  {
    title: 'Drums and cymbals',
    topics: balanceTopics,
    word: ({ balance }) => (balance ? balanceWord(balance) : ''),
  },
  { title: 'Noise', topics: ['noise', 'hum'], word: (_report, { status }) => noiseWords[status] },
  { title: 'Room', topics: roomTopics, word: ({ room }) => (room ? roomWord(room) : '') },
];

/** One row a section of the sheet: the most pressing finding of each take. Sections that neither take has are left out. */
export function findingRows(
  findings: ComparisonResponse['findings'],
  [before, after]: readonly [ReportResponse, ReportResponse],
): FindingRow[] {
  return sections
    .map(({ title, topics, word }) => {
      const side = (which: 'before' | 'after', report: ReportResponse): SaidSide | null => {
        const own = findings.flatMap((row) => (topics.includes(row.topic) ? (row[which] ?? []) : []));
        const [worst = null] = own.sort(
          (a, b) =>
            severity.indexOf(a.status) - severity.indexOf(b.status) ||
            topics.indexOf(a.topic) - topics.indexOf(b.topic),
        );
        return worst && { word: word(report, worst), finding: worst };
      };
      return { title, before: side('before', before), after: side('after', after) };
    })
    .filter((row) => row.before ?? row.after);
}

/** What the word before it says already. */
const saidByWord = /^(Flip|Keep|Can’t tell|Mixed)\b[^:;]*: /;

/** What is so, after its word; what to do about it stands on the sheet. */
export function saidBriefly({ sentence }: Finding): string {
  const [first] = sentence.replace(saidByWord, '').split(';');
  const told = first.charAt(0).toUpperCase() + first.slice(1);
  return told.endsWith('.') ? told : `${told}.`;
}
