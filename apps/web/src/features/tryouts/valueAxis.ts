import type { RankedPlace } from './rows';

/** Of all rows: where their pictures begin and end. */
export interface ValueAxis {
  min: number;
  max: number;
}

export function valueAxis(ranked: readonly RankedPlace[], showsZero: boolean): ValueAxis {
  const values = ranked.flatMap(({ row }) =>
    row.value === null
      ? []
      : [row.value, row.interval95?.low ?? row.value, row.interval95?.high ?? row.value],
  );
  const all = showsZero || values.length === 0 ? [0, ...values] : values;
  const [min, max] = [Math.min(...all), Math.max(...all)];
  const pad = (max - min || 1) * 0.06;
  return { min: showsZero && min === 0 ? 0 : min - pad, max: showsZero && max === 0 ? 0 : max + pad };
}
