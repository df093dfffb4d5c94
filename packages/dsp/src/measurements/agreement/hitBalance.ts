import { powerDb } from '../../decibel';
import type { KickHitFigures } from '../../facts';
import { forBins, lowEnd, type Band } from './choiceEnergy';
import { lowCutResponse } from './lowCut';
import type { HitBins } from './pairSpectrum';
import { thirdOctaves } from './thirdOctaves';

/** What one kick hit says of the two microphones. */
export interface HitBalance extends Pick<KickHitFigures, 'lowEnergy' | 'overheadThirdOctavesDbfs'> {
  /** The cross term of the low end with a low cut on the overhead. */
  readonly lowCrossLowCut: number;
}

const [HZ63, HZ125] = ['63', '125'].map(
  (nominal): Band => thirdOctaves.find((band) => band.nominal === nominal) ?? lowEnd,
);

/** Low end of one hit in both microphones, with and without a low cut, and where it lies in the overhead. */
export function hitBalance(bins: HitBins): HitBalance {
  const lowEnergy = { kick: 0, overhead: 0, cross: 0 };
  let lowCrossLowCut = 0;
  forBins(bins, lowEnd, (i, weight) => {
    const { re, im } = lowCutResponse(i * bins.binHz);
    lowEnergy.kick += weight * bins.skk[i];
    lowEnergy.overhead += weight * bins.soo[i];
    lowEnergy.cross += weight * bins.skoRe[i];
    lowCrossLowCut += weight * (bins.skoRe[i] * re + bins.skoIm[i] * im);
  });
  const overheadThirdOctavesDbfs = { hz63: overheadDbfs(bins, HZ63), hz125: overheadDbfs(bins, HZ125) };
  return { lowEnergy, lowCrossLowCut, overheadThirdOctavesDbfs };
}

function overheadDbfs(bins: HitBins, band: Band): number | null {
  let energy = 0;
  forBins(bins, band, (i, weight) => {
    energy += weight * bins.soo[i];
  });
  return powerDb(energy * bins.meanSquareOfBins);
}
