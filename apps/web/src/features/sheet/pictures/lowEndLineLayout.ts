/** Where the two added can stand: −3 dB is a full half lost against no help and no harm, +3 dB the most two can give. */
export const axisDb = { min: -3, max: 3.0103 };

export interface LineTick {
  levelDb: number;
  label: string;
}

export interface PlacedTick extends LineTick {
  x: number;
  /** Which side of its tick the label stands on, so that labels keep clear of each other. */
  side: 'left' | 'right';
  row: number;
}

/** Labels stand outward of their ticks; one that would run into a neighbour's goes one row lower. */
export function placeTicks(
  ticks: readonly LineTick[],
  xOf: (db: number) => number,
  widthPx: number,
): PlacedTick[] {
  const charPx = 6.4;
  const taken: { row: number; from: number; to: number }[] = [];
  return [...ticks]
    .sort((a, b) => a.levelDb - b.levelDb)
    .map((tick) => {
      const x = xOf(tick.levelDb);
      const textPx = tick.label.length * charPx + 8;
      const side = x - textPx > 0 && (tick.levelDb < 0 || x + textPx > widthPx) ? 'left' : 'right';
      const from = side === 'left' ? x - textPx : x;
      let row = 0;
      while (taken.some((t) => t.row === row && from < t.to && from + textPx > t.from)) row++;
      taken.push({ row, from, to: from + textPx });
      return { ...tick, x, side, row };
    });
}

/** The arc from ring to disc, as an SVG path that ends above the disc. */
export function arcPath(fromX: number, toX: number, y: number): string {
  const lift = Math.min(26, 12 + Math.abs(toX - fromX) * 0.12);
  const top = y - 12 - lift;
  const third = (toX - fromX) / 3;
  return `M${fromX} ${y - 10}C${fromX} ${top + 6} ${fromX + third * 0.5} ${top} ${fromX + third * 1.5} ${top}S${toX} ${top + 8} ${toX} ${y - 11}`;
}
