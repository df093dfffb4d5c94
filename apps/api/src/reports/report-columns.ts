import { defaultUserSettings, FindingStatus } from '@thudline/contracts';
import { ClipRun, HitFacts, reportFigures, TakeFacts, TrackFacts, TrackRole } from '@thudline/dsp';

const withoutRuns = (track: TrackFacts): TrackFacts => ({
  ...track,
  clipping: { ...track.clipping, runs: [] },
});

/** What a report row holds of the facts; `storedFacts` is the way back. */
export function reportColumns(facts: TakeFacts) {
  const agreement = facts.pairs[0]?.agreement;
  const kick = hardest(facts, 'kick');
  const overhead = hardest(facts, 'overhead');
  return {
    kickPeakDbfs: kick.peakDbfs,
    kickClipped: kick.clipped,
    overheadPeakDbfs: overhead.peakDbfs,
    overheadClipped: overhead.clipped,
    kickNoiseDbfs: kick.noiseDbfs,
    overheadNoiseDbfs: overhead.noiseDbfs,
    lowEndDb: agreement?.choices.find((choice) => choice.name === 'as-recorded')?.lowEndDb ?? null,
    flipGainDb: agreement?.flipGainMatchedDb ?? null,
    verdict: agreement?.verdict ?? 'cannot-tell',
    addingUp: addingUp(facts),
    summary: { ...facts, hits: [], tracks: facts.tracks.map(withoutRuns) },
    hits: [...facts.hits],
    clipRuns: facts.tracks.map((track) => [...track.clipping.runs]),
  };
}

/** Status of the finding on adding up, which is the same for every target. */
function addingUp(facts: TakeFacts): FindingStatus {
  const { findings } = reportFigures(facts, defaultUserSettings);
  return findings.find(({ topic }) => topic === 'adding-up')?.status ?? 'cannot-tell';
}

interface LoudestHit {
  peakDbfs: number | null;
  clipped: boolean;
  noiseDbfs: number | null;
}

function hardest(facts: TakeFacts, role: TrackRole): LoudestHit {
  const track = facts.tracks.find((candidate) => candidate.role === role);
  const clipped = (track?.clipping.runCount ?? 0) > 0;
  const peakDbfs = clipped ? null : (track?.loudestHitDbfs ?? null);
  return { peakDbfs, clipped, noiseDbfs: track?.noiseFloorDbfs ?? null };
}

interface StoredParts {
  summary: TakeFacts;
  hits: HitFacts[];
  clipRuns: ClipRun[][];
}

/** The whole facts again. */
export function storedFacts({ summary, hits, clipRuns }: StoredParts): TakeFacts {
  const tracks = summary.tracks.map((track, index) => ({
    ...track,
    clipping: { ...track.clipping, runs: clipRuns[index] ?? [] },
  }));
  return { ...summary, hits, tracks };
}

/** One row a pair that has kick hits. @param spectra - encoded, in the order of the pairs */
export function pairSpectrumColumns(facts: TakeFacts, spectra: readonly (Uint8Array | null)[]) {
  return facts.pairs.flatMap(({ a, b, spectrum: layout }, index) => {
    const data = spectra[index];
    if (!layout || !data) return [];
    const { binHz, binCount, hitCount } = layout;
    return [{ trackA: a, trackB: b, binHz, binCount, hitCount, data }];
  });
}
