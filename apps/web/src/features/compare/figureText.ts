import type { ComparedFigure } from '@thudline/contracts';
import { missing, number, signed } from '../../lib/format';

/** Why a change can't be told, as it stands in the row. */
const reasons: Record<string, string> = {
  'too-few-hits': 'too few hits',
  'strength-unmatched': 'strength can’t be matched',
  'not-measured': 'not measured in both',
  'cannot-tell': 'not there in both',
};

const value = (of: number | null, { decimals }: ComparedFigure) =>
  of === null ? missing : number(of, decimals);

/** "−0.7 → +0.6 dB", or why it can't be told. */
export function fromToText(figure: ComparedFigure): string {
  if (figure.change === null) return reasons[figure.reason ?? ''] ?? 'can’t be told';
  return `${value(figure.before, figure)} → ${value(figure.after, figure)} ${figure.unit}`;
}

/** "+1.1 to +1.5"; shares in per cent. Empty where a figure of the whole take has no interval. */
export function intervalText({ interval95, decimals, isShare }: ComparedFigure): string {
  if (!interval95) return '';
  const end = (at: number) => (isShare ? signed(at * 100, 0) : signed(at, decimals));
  return `${end(interval95.low)} to ${end(interval95.high)}${isShare ? ' %' : ''}`;
}

/** The last column: what changed, in a word. */
export function wordText({ change, clear, word }: ComparedFigure): string {
  if (change === null) return 'can’t tell';
  return clear && word ? word : 'no clear change';
}

/** One row as a sentence, for who can't see the picture. */
export function rowText(figure: ComparedFigure): string {
  const interval = intervalText(figure);
  const told = [fromToText(figure), interval && `95 % interval ${interval}`, wordText(figure)];
  return `${figure.label}: ${told.filter(Boolean).join(', ')}`;
}
