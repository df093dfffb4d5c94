import type { Target } from '@thudline/contracts';
import { number, signed } from '../../lib/format';

/**
 * Where things lie across a picture column, in per cent of its width, so that one drawing fits the table of a wide page
 * and the row of a phone. At 1280 px the level column is 226 px wide (7.75 px a dB) and the low-end column 128 px
 * (18 px a dB).
 */
const levelScale = { lowDb: -24, highDb: 0, startPercent: 3.6, endPercent: 85.9 };
const lowEndScale = { lowDb: -3, highDb: 3, startPercent: 7.8, endPercent: 92.2 };

type Scale = typeof levelScale;

function at(valueDb: number, { lowDb, highDb, startPercent, endPercent }: Scale): number {
  const share = (Math.min(highDb, Math.max(lowDb, valueDb)) - lowDb) / (highDb - lowDb);
  return startPercent + share * (endPercent - startPercent);
}

/** dBFS on the −24 … 0 axis; what lies outside stands at its end. */
export const levelPercent = (levelDbfs: number) => at(levelDbfs, levelScale);
/** Lower than the axis reaches: drawn at its end, pointing off. */
export const isBelowAxis = (levelDbfs: number) => levelDbfs < levelScale.lowDb;
/** Low end on the −3 … +3 dB axis. */
export const lowEndPercent = (lowEndDb: number) => at(lowEndDb, lowEndScale);

/** Crosses of clipped takes stand beyond the clips line. */
export const clippedPercent = 91.6;

export interface AxisLabel {
  text: string;
  percent: number;
  /** Which part of the text stands at that place. */
  anchor?: 'start' | 'end';
}

/** Closer than this two numbers would touch (caption size, at the narrowest column). */
const labelRoomDb = 3.5;

/** Numbers under "hardest hit": the target's ends always, the axis' own ends where there is room. */
export function levelLabels(target: Target): AxisLabel[] {
  const ends = [target.lowDbfs, target.highDbfs].filter((db) => db >= levelScale.lowDb);
  const free = (db: number) => ends.every((end) => Math.abs(end - db) >= labelRoomDb);
  const shown = [levelScale.lowDb, ...ends, levelScale.highDb].filter((db) => ends.includes(db) || free(db));
  return shown.map((db) => ({ text: number(db, Number.isInteger(db) ? 0 : 1), percent: levelPercent(db) }));
}

/** The outer two stay inside the column. */
export const lowEndLabels: AxisLabel[] = [
  { text: signed(-3, 0), percent: lowEndPercent(-3), anchor: 'start' },
  { text: signed(0, 0), percent: lowEndPercent(0) },
  { text: `${signed(3, 0)} dB`, percent: lowEndPercent(3), anchor: 'end' },
];
