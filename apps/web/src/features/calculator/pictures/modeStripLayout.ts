import type { RoomMode, RoomModeKind } from '@thudline/dsp';

/** Tall: along one direction, and strongest; middle: two, short: three. */
export const strokePx: Record<RoomModeKind, { heightPx: number; widthPx: number }> = {
  axial: { heightPx: 46, widthPx: 3 },
  tangential: { heightPx: 28, widthPx: 2 },
  oblique: { heightPx: 14, widthPx: 1.3 },
};

const edgePx = 6;
/** Between two numbers of the axis. */
const leastTickPx = 44;
const steps = [5, 10, 20, 50, 100];

export interface ModeStripLayout {
  strokes: { mode: RoomMode; x: number }[];
  ticks: { hz: number; x: number; text: string }[];
  x: (hz: number) => number;
}

/** Places of a room's lowest modes along an axis of frequency. */
export function modeStripLayout(
  modes: readonly RoomMode[],
  { widthPx, toHz }: { widthPx: number; toHz: number },
): ModeStripLayout {
  const lowestHz = modes[0].frequencyHz;
  const fromHz = lowestHz - (toHz - lowestHz) * 0.08;
  const endHz = toHz * 1.01;
  const x = (hz: number) => edgePx + ((hz - fromHz) / (endHz - fromHz)) * (widthPx - 2 * edgePx);
  const stepHz = steps.find((step) => x(fromHz + step) - x(fromHz) >= leastTickPx) ?? steps[steps.length - 1];
  const first = Math.ceil(fromHz / stepHz);
  const last = Math.floor(endHz / stepHz);
  return {
    x,
    strokes: modes
      .filter(({ frequencyHz }) => frequencyHz <= endHz)
      .map((mode) => ({ mode, x: x(mode.frequencyHz) })),
    ticks: Array.from({ length: last - first + 1 }, (_, i) => {
      const hz = (first + i) * stepHz;
      return { hz, x: x(hz), text: i === last - first ? `${hz} Hz` : String(hz) };
    }),
  };
}

/** Of all strokes, the one nearest to a place. */
export function nearestMode({ strokes }: Pick<ModeStripLayout, 'strokes'>, x: number): RoomMode | null {
  const sorted = [...strokes].sort((one, other) => Math.abs(one.x - x) - Math.abs(other.x - x));
  return sorted[0]?.mode ?? null;
}

/** Keeps words of about this width inside the picture. */
export function wordsX(x: number, words: string, widthPx: number): number {
  const wordsPx = words.length * 6.3;
  return Math.max(2, Math.min(x, widthPx - wordsPx));
}
