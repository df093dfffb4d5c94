import type { RoomMode } from '@thudline/dsp';

/** A stretch along one direction of the plan, as parts of its length. */
interface Stretch {
  from: number;
  to: number;
  /** In its middle, 0 … 1. */
  pressure: number;
}

/** 0 is none, 4 all there is. */
export interface Zone {
  x: number;
  y: number;
  width: number;
  height: number;
  level: number;
}

export interface ModeZones {
  zones: Zone[];
  /** Where there is none, as parts of the length and of the width. */
  nonesAlongLength: number[];
  nonesAlongWidth: number[];
}

const levels = 4;
/** Fine enough for zones that look like zones, coarse enough to draw at once. */
const stepsAcross = 64;
const stepsInAHalfWave = 16;

/** Where a mode is strong and where there is none, seen from above at the floor; x from the left, y from the front. */
export function modeZones([alongLength, alongWidth]: RoomMode['order']): ModeZones {
  const columns = stretches(alongLength);
  const rows = stretches(alongWidth);
  return {
    zones: rows.flatMap((row) => merged(columns, row)),
    nonesAlongLength: nones(alongLength),
    nonesAlongWidth: nones(alongWidth),
  };
}

function stretches(halfWaves: number): Stretch[] {
  const count = halfWaves === 0 ? 1 : Math.max(stepsAcross, halfWaves * stepsInAHalfWave);
  return Array.from({ length: count }, (_, i) => ({
    from: i / count,
    to: (i + 1) / count,
    pressure: Math.abs(Math.cos((halfWaves * Math.PI * (i + 0.5)) / count)),
  }));
}

/** Neighbours of one level are one zone. */
function merged(columns: readonly Stretch[], row: Stretch): Zone[] {
  const zones: Zone[] = [];
  for (const { from, to, pressure } of columns) {
    const level = Math.round(pressure * row.pressure * levels);
    const last = zones[zones.length - 1];
    if (last?.level === level) last.width = to - last.x;
    else zones.push({ x: from, y: row.from, width: to - from, height: row.to - row.from, level });
  }
  return zones;
}

/** Half way through each half wave. */
const nones = (halfWaves: number): number[] =>
  Array.from({ length: halfWaves }, (_, i) => (2 * i + 1) / (2 * halfWaves));

/** Words along an edge of the plan: strong at the walls and between, none where there is none. */
export function edgeWords(halfWaves: number): { at: number; strong: boolean }[] {
  if (halfWaves === 0) return [];
  return Array.from({ length: 2 * halfWaves + 1 }, (_, i) => ({
    at: i / (2 * halfWaves),
    strong: i % 2 === 0,
  }));
}
