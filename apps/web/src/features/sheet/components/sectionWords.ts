import type { Balance, Finding, FindingStatus, ReportResponse, Room } from '@thudline/contracts';
import { number } from '../../../lib/format';

export const severity: readonly FindingStatus[] = ['fix', 'watch', 'cannot-tell', 'good'];

/** Findings of some topics: the most pressing first, then in the order of the topics. */
export function findingsOf(report: ReportResponse, topics: readonly Finding['topic'][]): Finding[] {
  return report.findings
    .filter((finding) => topics.includes(finding.topic))
    .sort(
      (a, b) =>
        severity.indexOf(a.status) - severity.indexOf(b.status) ||
        topics.indexOf(a.topic) - topics.indexOf(b.topic),
    );
}

export const worstStatus = (findings: readonly Finding[]): FindingStatus => findings[0]?.status ?? 'good';

const levelWords = { clipped: 'clipped', hot: 'hot', 'on-target': 'on target', low: 'low' } as const;
const levelOrder = ['clipped', 'hot', 'low', 'on-target'] as const;

/** One word for both microphones' levels: the one that asks for most. */
export function levelsWord({ kick, overhead }: ReportResponse): string {
  const worst = levelOrder.find((level) => kick.level === level || overhead.level === level);
  return worst ? levelWords[worst] : 'can’t tell';
}

const verdictWords = {
  keep: 'keep',
  flip: 'flip',
  'either-way': 'either way',
  'cannot-tell': 'can’t tell',
} as const;

export const verdictWord = ({ agreement }: ReportResponse): string => verdictWords[agreement.verdict];

/** Nearer than this nobody hears which is louder. */
const alikeDb = 1;

/** Which of the two is louder in the overhead. */
export function balanceWord({ differenceDb }: Balance): string {
  if (differenceDb === null) return 'can’t tell';
  if (Math.abs(differenceDb) < alikeDb) return 'alike';
  return differenceDb > 0 ? 'cymbals louder' : 'drums louder';
}

export const roomWord = ({ decayS }: Room): string =>
  decayS === null ? 'can’t tell' : `${number(decayS, 2)} s`;

export const levelTopics = [
  'kick-level',
  'overhead-level',
  'overs',
  'flattened',
  'dropouts',
  'noise',
  'hum',
  'dc-offset',
] as const;
export const addingUpTopics = ['late-start', 'adding-up', 'arrival'] as const;
export const balanceTopics = ['balance'] as const;
export const roomTopics = ['room'] as const;
