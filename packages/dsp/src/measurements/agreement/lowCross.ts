import { forBins, lowEnd } from './choiceEnergy';
import { lowCutResponse } from './lowCut';
import type { HitBalance } from './pairSpectrum';

/** Whether one hit's low end adds as recorded, with and without a low cut on the overhead. */
export function lowCross(skoRe: Float64Array, skoIm: Float64Array, binHz: number): HitBalance {
  let plain = 0;
  let withCut = 0;
  forBins({ skk: skoRe, binHz }, lowEnd, (i, weight) => {
    const { re, im } = lowCutResponse(i * binHz);
    plain += weight * skoRe[i];
    withCut += weight * (skoRe[i] * re + skoIm[i] * im);
  });
  return { lowCross: plain, lowCrossLowCut: withCut };
}
