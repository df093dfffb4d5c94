import type {
  ChangeCategory,
  ChangeFigure,
  PlanPlace,
  RoomResponse,
  RoomSurface,
  TrendFigure,
} from '@thudline/contracts';
import { absorptionTable } from '@thudline/dsp';
import { number, plural, signed } from '../../lib/format';

export const categoryWords: Record<ChangeCategory, string> = {
  placement: 'placement',
  'soft-material': 'soft material',
  'hard-material': 'hard material',
  floor: 'floor',
  noise: 'noise',
  other: 'something else',
};

export const trendWords: Record<TrendFigure, string> = {
  'decay-500': 'decay at 500 Hz',
  'decay-1000': 'decay at 1 kHz',
  'decay-2000': 'decay at 2 kHz',
  'decay-4000': 'decay at 4 kHz',
  'early-to-late-500': 'early against late at 500 Hz',
  brightness: 'brightness',
  'noise-kick': 'noise floor, kick',
  'noise-overhead': 'noise floor, overhead',
  'cymbals-over-drums': 'cymbals against drums',
  'hardest-kick': 'hardest kick',
  'hardest-overhead': 'hardest hit, overhead',
  'low-end': 'low end as recorded',
  arrival: 'arrival',
};

export type TrendUnit = 's' | 'dB' | 'dBFS' | 'ms';

export const trendUnit = (figure: TrendFigure): TrendUnit => {
  if (figure.startsWith('decay')) return 's';
  if (figure === 'arrival') return 'ms';
  return figure.startsWith('noise') || figure.startsWith('hardest') ? 'dBFS' : 'dB';
};

/** A value of a figure over time, with its unit. */
export const trendValue = (value: number, figure: TrendFigure): string => {
  const unit = trendUnit(figure);
  return `${number(value, unit === 's' || unit === 'ms' ? 2 : 1)} ${unit}`;
};

const figureWords: Record<string, string> = {
  'decay-500': 'decay at 500 Hz',
  'decay-1000': 'decay at 1 kHz',
  'decay-2000': 'decay at 2 kHz',
  'decay-4000': 'decay at 4 kHz',
  'early-to-late': 'early against late',
  'overhead-63': 'overhead at 63 Hz',
  'overhead-125': 'overhead at 125 Hz',
  brightness: 'brightness',
  'noise-overhead': 'noise floor, overhead',
  'noise-kick': 'noise floor, kick',
};

export const figureName = ({ key }: Pick<ChangeFigure, 'key'>): string => figureWords[key] ?? key;

export const figureText = (value: number, unit: ChangeFigure['unit']): string =>
  number(value, unit === 's' ? 2 : unit === 'ms' ? 1 : 0);

/** "0.60 → 0.49 s, shorter", or that nothing clear changed. */
export function changeWords({ before, after, unit, clear, word }: ChangeFigure): string {
  if (!clear || before === null || after === null) return 'no clear change';
  return `${figureText(before, unit)} → ${figureText(after, unit)} ${unit}, ${word}`;
}

/** The same for whoever can't see the row. */
export function changeInWords(figure: ChangeFigure): string {
  const { before, after, unit, change, step } = figure;
  if (before === null || after === null) return `${figureName(figure)}: can’t tell.`;
  const moved = step.kind === 'share' ? `${signed((change ?? 0) * 100, 0)} %` : signed(change ?? 0);
  const told = figure.clear ? (figure.word ?? '') : 'no clear change';
  return `${figureName(figure)}: ${figureText(before, unit)} ${unit} before, ${figureText(after, unit)} ${unit} after (${moved}), ${told}.`;
}

const materialName = (id: string) => absorptionTable.find((material) => material.id === id)?.name ?? id;

/** "5.2 × 3.1 × 2.4 m · Concrete or terrazzo floor". */
export function roomMeasures({ shape, surfaces }: RoomResponse, unit: 'metre' | 'foot'): string {
  const materials = [...new Set(surfaces.map(({ materialId }) => materialName(materialId).toLowerCase()))];
  return [sizeWords(shape, unit), materials.join(', ')].filter(Boolean).join(' · ');
}

const feet = 3.28084;

export function sizeWords(shape: RoomResponse['shape'], unit: 'metre' | 'foot'): string {
  const factor = unit === 'metre' ? 1 : feet;
  const name = unit === 'metre' ? 'm' : 'ft';
  if (shape.kind === 'other')
    return shape.volumeM3 === null ? '' : `${number(shape.volumeM3 * factor ** 3, 0)} ${name}³`;
  const sides = [shape.lengthM, shape.widthM, shape.heightM];
  const known = sides.filter((side) => side !== null);
  return known.length === 0 ? '' : `${known.map((side) => number(side * factor)).join(' × ')} ${name}`;
}

const dayMonth = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', timeZone: 'UTC' });

/** "19 Oct" of a day without a time. */
export const dayWords = (day: string): string => dayMonth.format(new Date(`${day.slice(0, 10)}T00:00:00Z`));

/** "The garage · room log · 6 changes, 15 takes since 5 Oct". */
export function logWords({ name, changeCount, takeCount, firstTakeAt }: RoomResponse): string {
  const since = firstTakeAt ? ` since ${dayWords(firstTakeAt)}` : '';
  return `${name} · room log · ${plural(changeCount, 'change')}, ${plural(takeCount, 'take')}${since}`;
}

export const surfaceWords: Record<RoomSurface['place'], string> = {
  floor: 'Floor',
  ceiling: 'Ceiling',
  front: 'Front wall',
  back: 'Back wall',
  left: 'Left wall',
  right: 'Right wall',
};

/** "3.4 m from the left, 1.5 m from the front". */
export function placeWords({ xM, yM }: PlanPlace, unit: 'metre' | 'foot'): string {
  const told = (metres: number) =>
    unit === 'metre' ? `${number(metres, 2)} m` : `${number(metres * feet)} ft`;
  return `${told(xM)} from the left, ${told(yM)} from the front`;
}
