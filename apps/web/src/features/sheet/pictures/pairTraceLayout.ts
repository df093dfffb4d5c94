import { lowPass } from '@thudline/dsp';
import type { Excerpt } from '../hooks/useExcerpt';
import type { TraceView } from './traceView';

/** What a trace shows at first, in ms around the hit. Low end needs two periods of 50 Hz; the first arrival needs a close look. */
export const traceWindows = {
  low: { fromMs: -6, toMs: 44 },
  every: { fromMs: -1.5, toMs: 10 },
} as const;
export type TraceBand = keyof typeof traceWindows;

/** Above the highest band the verdict looks at (30–200 Hz). */
const lowEndCutoffHz = 200;

export interface TracePoints {
  kick: Float64Array;
  overhead: Float64Array;
}

/** Both microphones as the band asks for: the whole excerpt, filtered alike, zero phase. */
export function filtered(excerpt: Excerpt, band: TraceBand): { kick: Float32Array; overhead: Float32Array } {
  if (band === 'every') return excerpt;
  const options = { sampleRateHz: excerpt.sampleRateHz, cutoffHz: lowEndCutoffHz };
  return { kick: lowPass(excerpt.kick, options), overhead: lowPass(excerpt.overhead, options) };
}

/**
 * Values at `count` evenly spaced times of the window; between samples a straight line.
 *
 * @param shiftMs - plays the overhead this much earlier
 */
export function sampleTrace({
  signals,
  excerpt,
  hitS,
  view,
  shiftMs,
  count,
}: {
  signals: { kick: Float32Array; overhead: Float32Array };
  excerpt: Pick<Excerpt, 'sampleRateHz' | 'startS'>;
  hitS: number;
  view: TraceView;
  shiftMs: number;
  count: number;
}): TracePoints {
  const { fromMs, toMs } = view;
  const at = (samples: Float32Array, timeS: number) => {
    const position = (timeS - excerpt.startS) * excerpt.sampleRateHz;
    const index = Math.floor(position);
    const share = position - index;
    return (samples[index] ?? 0) * (1 - share) + (samples[index + 1] ?? 0) * share;
  };
  const times = Float64Array.from(
    { length: count },
    (_, i) => hitS + (fromMs + ((toMs - fromMs) * i) / (count - 1)) / 1000,
  );
  return {
    kick: times.map((timeS) => at(signals.kick, timeS)),
    overhead: times.map((timeS) => at(signals.overhead, timeS + shiftMs / 1000)),
  };
}

/** Largest absolute value, for a scale; 1 for silence so that nothing divides by zero. */
export function largest(...curves: ArrayLike<number>[]): number {
  let top = 0;
  for (const curve of curves) for (let i = 0; i < curve.length; i++) top = Math.max(top, Math.abs(curve[i]));
  return top || 1;
}

export interface TraceScale {
  x: (index: number) => number;
  y: (value: number) => number;
}

const fixed = (value: number) => value.toFixed(1);

export function linePath(values: ArrayLike<number>, { x, y }: TraceScale): string {
  let path = '';
  for (let i = 0; i < values.length; i++)
    path += `${i === 0 ? 'M' : 'L'}${fixed(x(i))} ${fixed(y(values[i]))}`;
  return path;
}

/** The area between the axis and what both share while they push the same way. */
export function togetherPath({ kick, overhead }: TracePoints, scale: TraceScale): string {
  const shared = kick.map((k, i) => {
    const o = overhead[i];
    return k * o > 0 ? Math.sign(k) * Math.min(Math.abs(k), Math.abs(o)) : 0;
  });
  return areaPath(shared, scale);
}

/** The area between a curve and the axis. */
export function areaPath(values: ArrayLike<number>, scale: TraceScale): string {
  const last = values.length - 1;
  return `${linePath(values, scale)}L${fixed(scale.x(last))} ${fixed(scale.y(0))}L${fixed(scale.x(0))} ${fixed(scale.y(0))}Z`;
}

/** The areas between the two curves while they pull against each other. */
export function apartPath({ kick, overhead }: TracePoints, { x, y }: TraceScale): string {
  let path = '';
  let runStart = -1;
  const close = (end: number) => {
    for (let i = runStart; i < end; i++)
      path += `${i === runStart ? 'M' : 'L'}${fixed(x(i))} ${fixed(y(kick[i]))}`;
    for (let i = end - 1; i >= runStart; i--) path += `L${fixed(x(i))} ${fixed(y(overhead[i]))}`;
    path += 'Z';
  };
  for (let i = 0; i <= kick.length; i++) {
    const apart = i < kick.length && kick[i] * overhead[i] < 0;
    if (apart && runStart < 0) runStart = i;
    if (!apart && runStart >= 0) {
      if (i - runStart > 1) close(i);
      runStart = -1;
    }
  }
  return path;
}

/** How much of the window the two spend pushing the same way, weighted by what they share; 0–1. For the text alternative. */
export function togetherShare({ kick, overhead }: TracePoints): number {
  let same = 0;
  let all = 0;
  kick.forEach((k, i) => {
    const weight = Math.abs(k * overhead[i]);
    all += weight;
    if (k * overhead[i] > 0) same += weight;
  });
  return all === 0 ? 0 : same / all;
}
