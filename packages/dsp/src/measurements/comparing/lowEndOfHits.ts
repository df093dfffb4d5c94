import { lowEnergySums, type KickHitTold } from './takeSide';

/** As for the two added in `choiceEnergy`: a floor that keeps levels finite where two cancel wholly. */
const DEEPEST_SHARE = 1e-10;

export interface LowEndOptions {
  /** Of the overhead, linear; below 0 where it is flipped. */
  readonly gain: number;
  /** `power-sum`: what two sounds that know nothing of each other would make; `kick`: the kick microphone alone. */
  readonly against: 'power-sum' | 'kick';
}

/** 30–150 Hz of the two added over some hits, as the pair spectrum of these hits would say it; dB. */
export function lowEndDb(hits: readonly KickHitTold[], { gain, against }: LowEndOptions): number {
  const { kick, overhead, cross } = lowEnergySums(hits);
  const powerSum = kick + gain * gain * overhead;
  const added = Math.max(powerSum + 2 * gain * cross, powerSum * DEEPEST_SHARE);
  return 10 * Math.log10(added / (against === 'kick' ? kick : powerSum));
}

/** How alike the two microphones are over some hits, 30–150 Hz: −1 … 1; 0 where one of them is silent. */
export function lowCorrelationOf(hits: readonly KickHitTold[]): number {
  const { kick, overhead, cross } = lowEnergySums(hits);
  return kick * overhead > 0 ? Math.max(-1, Math.min(1, cross / Math.sqrt(kick * overhead))) : 0;
}
