import type { HitFacts, RoomBandFacts, RoomFacts, SpreadFigure } from '../../facts';
import type { TrackSource } from '../../trackSource';
import { rounded } from '../rounded';
import { interquartileRange, median } from '../statistics';
import type { DecayFigures } from './decayFigures';
import { DECAY_BANDS_HZ, readDecay, type SnareRead } from './readDecay';
import { loudDrumHits } from './snareHits';

/** docs/measurements.md, 7. */
const FEWEST_HITS = 6;
/** ISO 3382-1 Annex A averages these two octaves into one number for the decay (from memory). */
const MIDDLE_BANDS_HZ: readonly number[] = [500, 1000];

/**
 * How a loud snare dies away in the room, as the overhead hears it: octave bands 500 Hz to 4 kHz, median over hits.
 *
 * Only drums with wires that are among the loud hits, with nothing in the 150 ms before and 200 ms after. A figure for
 * comparing takes of one snare in one room: the snare's own ringing and the overhead's nearness are part of it, so it is no
 * standard room measurement.
 *
 * @param overhead - read around at most 24 hits
 * @param options.hits - all hits of the take in order of time; `place` is the overhead's in `peaksDbfs`
 * @returns seconds per 60 dB; null with a reason below six hits
 * @see decayFigures for the definitions and their sources
 */
export async function roomDecay(
  overhead: TrackSource,
  { hits, place }: { readonly hits: readonly HitFacts[]; readonly place: number },
): Promise<RoomFacts> {
  const read: SnareRead[] = [];
  for (const hit of loudDrumHits(hits, place)) {
    const figures = await readDecay(overhead, hit);
    if (figures) read.push(figures);
  }
  const bands = DECAY_BANDS_HZ.map((centreHz, band) =>
    bandFacts(
      centreHz,
      read.map((hit) => hit.bands[band]),
    ),
  );
  const middle = bands.filter((band) => MIDDLE_BANDS_HZ.includes(band.centreHz));
  return {
    snareHits: read.length,
    decayS: meanOf(middle.map((band) => band.t20S)),
    earlyS: meanOf(middle.map((band) => band.earlyS)),
    bands,
    reason: reasonFor(read.length, middle),
    brightnessPerHitDb: read.flatMap(({ brightnessDb }) => brightnessDb ?? []).map(rounded),
  };
}

function bandFacts(centreHz: number, hits: readonly DecayFigures[]): RoomBandFacts {
  const judged = (figure: keyof DecayFigures): number[] => hits.flatMap((hit) => hit[figure] ?? []);
  const over = (figure: keyof DecayFigures): SpreadFigure | null => {
    const values = judged(figure);
    const middle = median(values);
    const iqr = interquartileRange(values);
    return values.length < FEWEST_HITS || middle === null || iqr === null ? null : { median: middle, iqr };
  };
  const each = (figure: keyof DecayFigures): number[] => judged(figure).map(rounded);
  return {
    centreHz,
    t20S: over('t20S'),
    earlyS: over('earlyS'),
    earlyToLateDb: over('earlyToLateDb'),
    perHit: { t20S: each('t20S'), earlyS: each('earlyS'), earlyToLateDb: each('earlyToLateDb') },
  };
}

function meanOf(figures: readonly (SpreadFigure | null)[]): number | null {
  const known = figures.flatMap((figure) => figure?.median ?? []);
  return known.length < figures.length ? null : known.reduce((sum, value) => sum + value, 0) / known.length;
}

function reasonFor(snareHits: number, middle: readonly RoomBandFacts[]): RoomFacts['reason'] {
  if (snareHits < FEWEST_HITS) return 'too-few-snares';
  return middle.some((band) => band.t20S === null) ? 'cut-short' : null;
}
