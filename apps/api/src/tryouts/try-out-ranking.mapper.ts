import { TryOutRankingResponse, TryOutRankingRow } from '@thudline/contracts';
import { RankedTake, TakeFacts, TryOutRanking } from '@thudline/dsp';

interface MeasuredPlace {
  placeId: string;
  facts: TakeFacts;
}

/** Best first; what can't be ranked keeps its order at the end. */
export function tryOutRankingResponseOf(
  places: MeasuredPlace[],
  { unit, step, higherIsBetter, takes }: TryOutRanking,
): Pick<TryOutRankingResponse, 'unit' | 'step' | 'higherIsBetter' | 'rows'> {
  const rows = takes.flatMap((ranked, index) => {
    const place = places.at(index);
    return place ? [rowOf(place, ranked)] : [];
  });
  const order = ({ rank }: TryOutRankingRow) => rank ?? Infinity;
  return {
    unit,
    step,
    higherIsBetter,
    rows: rows.sort((a, b) => (order(a) === order(b) ? 0 : order(a) - order(b))),
  };
}

function rowOf({ placeId, facts }: MeasuredPlace, ranked: RankedTake): TryOutRankingRow {
  const { value, interval95, rank, fromBest, standing, word, reason, hits, flipped } = ranked;
  return {
    placeId,
    value,
    interval95,
    rank,
    fromBest,
    standing,
    word,
    reason,
    hits,
    flipped,
    cymbalsOverDrumsDb: facts.balance?.differenceDb ?? null,
    heard: {
      firstKickS: facts.hits.find(({ kind }) => kind === 'kick')?.timeS ?? 0,
      durationS: facts.durationS,
      sampleRateHz: facts.sampleRateHz,
      overheadGainDb: facts.pairs[0]?.agreement.matchGainDb ?? 0,
    },
  };
}
