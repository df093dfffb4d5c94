import type { AgreementFacts, ArrivalFacts, NamedChoiceFacts, PairSpectrum } from '../../facts';
import { bestShift } from './bestShift';
import { bandEnergies, forBins, lowEnd, type Band } from './choiceEnergy';
import { choiceLowEnd, deepestThirdOctave, flipGain } from './choiceLevels';
import type { HitBalance } from './hitBalance';
import { withLowCut } from './lowCut';
import { thirdOctaves } from './thirdOctaves';
import { verdictOf, type VerdictResult } from './verdict';

export interface AgreementInput {
  readonly spectrum: PairSpectrum | null;
  readonly balances: readonly HitBalance[];
  /** How alike the hits are, see {@link createHitsAlike}. */
  readonly hitsAlike: number | null;
  readonly matchGainDb: number | null;
  readonly arrival: ArrivalFacts;
}

const BANDS_TO_HZ = [120, 150, 200];
/** docs/measurements.md, 5: a third-octave that moves the other way by this much is named. */
const CONTRARY_FROM_DB = 1.5;
/** Only where it can be heard: 31.5 Hz to 5 kHz, with 1 % of what lies where a kick sounds; common practice, no source. */
const NAMED_CENTRES: Band = { lowHz: 30, highHz: 5100 };
const KICK_BAND: Band = { lowHz: 30, highHz: 800 };
const NAMED_SHARE = 0.01;

/** What the two microphones do to each other at the kick: the heart of the sheet. */
export function agreement(input: AgreementInput): AgreementFacts {
  const { spectrum, balances, hitsAlike, matchGainDb, arrival } = input;
  if (!spectrum || matchGainDb === null) return nothingToAdd(balances.length, spectrum !== null);
  const sums = judge(spectrum, {
    crosses: balances.map((hit) => hit.lowEnergy.cross),
    gainDb: matchGainDb,
    hitsAlike,
    arrival,
  });
  const cut = judge(withLowCut(spectrum), {
    crosses: balances.map((hit) => hit.lowCrossLowCut),
    gainDb: matchGainDb,
    hitsAlike,
    arrival,
  });
  return {
    lowCorrelation: lowCorrelation(spectrum),
    flipGainRecordedDb: flipGain(spectrum, { gainDb: 0 }),
    flipGainMatchedDb: sums.flipGainDb,
    matchGainDb,
    hitsUsed: balances.length,
    agreeingHits: sums.agreeingHits,
    hitsAlike,
    verdict: sums.verdict,
    sure: sums.sure,
    reason: sums.reason,
    bands: sums.bands,
    lowCut: cut.flipGainDb === null ? null : { flipGainMatchedDb: cut.flipGainDb, verdict: cut.verdict },
    contraryBands: contraryBands(spectrum, matchGainDb, sums.flipGainDb),
    choices: namedChoices(spectrum, matchGainDb, arrival),
  };
}

interface Judged extends VerdictResult {
  readonly flipGainDb: number | null;
  readonly agreeingHits: number;
  readonly bands: AgreementFacts['bands'];
}

interface JudgedBy extends Pick<AgreementInput, 'hitsAlike' | 'arrival'> {
  readonly crosses: readonly number[];
  readonly gainDb: number;
}

function judge(spectrum: PairSpectrum, { crosses, gainDb, hitsAlike, arrival }: JudgedBy): Judged {
  const flipGainDb = flipGain(spectrum, { gainDb });
  const bands = BANDS_TO_HZ.flatMap((highHz) => {
    const bandGainDb = flipGain(spectrum, { gainDb, highHz });
    return bandGainDb === null ? [] : [{ lowHz: lowEnd.lowHz, highHz, flipGainDb: bandGainDb }];
  });
  const sign = Math.sign(crosses.reduce((sum, cross) => sum + cross, 0));
  const agreeingHits = crosses.filter((cross) => sign !== 0 && Math.sign(cross) === sign).length;
  const verdict = verdictOf({
    hits: crosses.length,
    agreeingHits,
    hitsAlike,
    arrivalIqrMs: arrival.arrivalIqrMs,
    arrives: arrival.reason !== 'too-few-hits',
    flipGainDb,
    bandGainsDb: bands.map((band) => band.flipGainDb),
  });
  return { ...verdict, flipGainDb, agreeingHits, bands };
}

function lowCorrelation(spectrum: PairSpectrum): number | null {
  let [kick, overhead, cross] = [0, 0, 0];
  forBins(spectrum, lowEnd, (i, weight) => {
    kick += weight * spectrum.skk[i];
    overhead += weight * spectrum.soo[i];
    cross += weight * spectrum.skoRe[i];
  });
  return kick > 0 && overhead > 0 ? Math.max(-1, Math.min(1, cross / Math.sqrt(kick * overhead))) : null;
}

function contraryBands(
  spectrum: PairSpectrum,
  gainDb: number,
  flipGainDb: number | null,
): AgreementFacts['contraryBands'] {
  if (flipGainDb === null) return [];
  const powerSum = (band: Band): number =>
    bandEnergies(spectrum, { flipped: false, shiftMs: 0, gainDb }, band).powerSum;
  const least = NAMED_SHARE * powerSum(KICK_BAND);
  const named = thirdOctaves.filter(
    (band) =>
      band.centreHz >= NAMED_CENTRES.lowHz && band.centreHz < NAMED_CENTRES.highHz && powerSum(band) >= least,
  );
  return named.flatMap(({ centreHz, lowHz, highHz }) => {
    const bandGainDb = flipGain(spectrum, { gainDb, lowHz, highHz }) ?? 0;
    const otherWay = bandGainDb * flipGainDb < 0 && Math.abs(bandGainDb) >= CONTRARY_FROM_DB;
    return otherWay ? [{ centreHz, flipGainDb: bandGainDb }] : [];
  });
}

function namedChoices(spectrum: PairSpectrum, gainDb: number, arrival: ArrivalFacts): NamedChoiceFacts[] {
  const named = (name: NamedChoiceFacts['name'], flipped: boolean, shiftMs: number): NamedChoiceFacts[] => {
    const choice = { flipped, shiftMs, gainDb };
    const lowEndDb = choiceLowEnd(spectrum, choice);
    if (lowEndDb === null) return [];
    return [{ name, flipped, shiftMs, lowEndDb, deepest: deepestThirdOctave(spectrum, choice) }];
  };
  const { arrivalMs } = arrival;
  const best = bestShift(spectrum, { arrival, gainDb });
  return [
    ...named('as-recorded', false, 0),
    ...named('flipped', true, 0),
    ...(arrivalMs === null ? [] : named('shifted', false, arrivalMs)),
    ...(arrivalMs === null ? [] : named('shifted-flipped', true, arrivalMs)),
    ...(best ? named('best-shift', best.flipped, best.shiftMs) : []),
  ];
}

function nothingToAdd(hitsUsed: number, hasHits: boolean): AgreementFacts {
  return {
    lowCorrelation: null,
    flipGainRecordedDb: null,
    flipGainMatchedDb: null,
    matchGainDb: null,
    hitsUsed,
    agreeingHits: 0,
    hitsAlike: null,
    verdict: 'cannot-tell',
    sure: false,
    reason: hasHits ? 'overhead-silent' : 'no-kick-hits',
    bands: [],
    lowCut: null,
    contraryBands: [],
    choices: [],
  };
}
