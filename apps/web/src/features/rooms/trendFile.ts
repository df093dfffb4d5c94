import type { RoomTrendResponse } from '@thudline/contracts';
import { csvRow } from '../../lib/csv';
import { trendUnit, trendWords } from './roomWords';

/** A figure over time as comma-separated values, a take a row. */
export function trendCsv({ figure, points }: RoomTrendResponse): string {
  const value = `${trendWords[figure]}, ${trendUnit(figure)}`;
  const head = ['take', 'recorded at', value, 'between the quartiles', 'setup'];
  const rows = points.map((point) => [
    String(point.number),
    point.recordedAt,
    String(point.value),
    point.iqr === null ? '' : String(point.iqr),
    point.setup?.name ?? '',
  ]);
  return [head, ...rows].map(csvRow).join('\r\n') + '\r\n';
}

export interface MiddleAndSpread {
  middle: number;
  /** Half of all takes lie from here … */
  low: number;
  /** … to here. */
  high: number;
}

/** @returns null without a take */
export function middleAndSpread(values: readonly number[]): MiddleAndSpread | null {
  if (values.length === 0) return null;
  const sorted = [...values].sort((one, other) => one - other);
  const at = (share: number) => {
    const place = share * (sorted.length - 1);
    const below = sorted[Math.floor(place)];
    return below + (sorted[Math.ceil(place)] - below) * (place - Math.floor(place));
  };
  return { middle: at(0.5), low: at(0.25), high: at(0.75) };
}
