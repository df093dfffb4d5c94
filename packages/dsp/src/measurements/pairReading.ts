import type { AgreementFacts, ArrivalFacts, HitFacts, PairSpectrum } from '../facts';
import { agreement } from './agreement/agreement';
import { createHitsAlike } from './agreement/hitsAlike';
import { hitBalance } from './agreement/hitBalance';
import { matchGainDb } from './agreement/matchGain';
import { createPairGatherer } from './agreement/pairSpectrum';
import { createArrivalMeter } from './arrival/arrival';
import type { KickHit } from './hits/listHits';
import type { PairPart } from './readPairPart';

/** What all kick hits of one pair say. */
export interface PairReading {
  /** Peaks in the order [kick microphone, overhead]. */
  readonly kickHits: readonly KickHit[];
  readonly spectrum: PairSpectrum | null;
  /** Told when it is asked for, which takes a while: other work may go on beside. */
  arrival(): ArrivalFacts;
  /** @param places - of the two in the hits' peaks */
  agreement(
    arrival: ArrivalFacts,
    hits: readonly HitFacts[],
    places: { readonly a: number; readonly b: number },
  ): AgreementFacts;
}

/** @param parts - in order of time */
export function pairReading(parts: readonly PairPart[], sampleRateHz: number): PairReading {
  const gatherer = createPairGatherer({ sampleRateHz, perHit: hitBalance });
  const alike = createHitsAlike();
  for (const part of parts) {
    gatherer.include(part.spectrum);
    alike.include(part.alike);
  }
  const spectrum = gatherer.result();
  const hitsAlike = alike.result();
  const balances = parts.flatMap((part) => part.balances);
  return {
    kickHits: parts.flatMap((part) => part.kickHits),
    spectrum,
    arrival() {
      const meter = createArrivalMeter(sampleRateHz);
      for (const part of parts) meter.include(part.arrival);
      return meter.result();
    },
    agreement: (arrival, hits, places) =>
      agreement({ spectrum, balances, hitsAlike, arrival, matchGainDb: matchGainDb(hits, places) }),
  };
}
