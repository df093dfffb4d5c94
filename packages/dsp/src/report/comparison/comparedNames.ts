import type { ComparedKey } from '../../measurements/comparing/comparedFigure';

/** How a figure that two takes are compared by is named and written. */
export interface ComparedName {
  readonly label: string;
  readonly decimals: number;
}

const named = (label: string, decimals = 1): ComparedName => ({ label, decimals });

/** Every figure that two takes are compared by. */
export const comparedNames: Readonly<Record<ComparedKey, ComparedName>> = {
  'low-end': named('low end, added up'),
  'hardest-kick': named('hardest kick hit'),
  'hardest-overhead': named('hardest overhead hit'),
  'cymbals-over-drums': named('cymbals over drums'),
  arrival: named('arrival'),
  'noise-kick': named('noise, kick'),
  'noise-overhead': named('noise, overhead'),
  evenness: named('evenness of kicks'),
  attack: named('attack'),
  'overhead-63': named('overhead at 63 Hz'),
  'overhead-125': named('overhead at 125 Hz'),
  'decay-500': named('decay, 500 Hz', 2),
  'decay-1000': named('decay, 1 kHz', 2),
  'decay-2000': named('decay, 2 kHz', 2),
  'decay-4000': named('decay, 4 kHz', 2),
  'early-to-late': named('snare, early to late'),
  brightness: named('brightness of the snare'),
};
