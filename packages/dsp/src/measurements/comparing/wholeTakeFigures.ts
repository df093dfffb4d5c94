import { untold, wordOf, type ComparedFigure, type FigureRule } from './comparedFigure';
import { worthSteps } from './takeChange';
import type { TakeSide } from './takeSide';

interface WholeTakeRule extends FigureRule {
  value(side: TakeSide): number | null;
}

const peak = { unit: 'dBFS', step: worthSteps.peakDb, words: { more: 'higher', less: 'lower' } } as const;
const noise = {
  unit: 'dBFS',
  step: worthSteps.noiseDb,
  words: { more: 'noisier', less: 'quieter' },
} as const;

const rules: readonly WholeTakeRule[] = [
  { ...peak, key: 'hardest-kick', value: ({ facts, pair }) => facts.tracks[pair.a].loudestHitDbfs },
  { ...peak, key: 'hardest-overhead', value: ({ facts, pair }) => facts.tracks[pair.b].loudestHitDbfs },
  { ...noise, key: 'noise-kick', value: ({ facts, pair }) => facts.tracks[pair.a].noiseFloorDbfs },
  { ...noise, key: 'noise-overhead', value: ({ facts, pair }) => facts.tracks[pair.b].noiseFloorDbfs },
];

/** Figures of a whole take: a plain difference, clear beyond its step. */
export function wholeTakeFigures(sides: {
  readonly before: TakeSide;
  readonly after: TakeSide;
}): ComparedFigure[] {
  return rules.map((rule) => {
    const [before, after] = [rule.value(sides.before), rule.value(sides.after)];
    if (before === null || after === null) return { ...untold(rule, 'cannot-tell'), before, after };
    const change = after - before;
    const clear = Math.abs(change) > rule.step.size;
    return {
      ...untold(rule, 'cannot-tell'),
      before,
      after,
      change,
      clear,
      reason: null,
      word: wordOf(rule, { change, clear }),
    };
  });
}
