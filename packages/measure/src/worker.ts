import type { MessagePort } from 'node:worker_threads';
import type { TakeFacts } from '@thudline/dsp';
import { encodePairSpectrum, encodePeaks, type MeasureStage } from '@thudline/dsp/measuring';
import { measureFiles, type MeasuredFile } from './measureFiles';
import { MeasureRefusal, type MeasureRefusalFacts } from './measureRefusal';
import type { TrackChoice } from './trackChoice';

export { addJob } from './addJob';

/** What a worker thread is given; everything in it can cross a thread. */
export interface MeasureJob {
  readonly paths: readonly string[];
  readonly tracks: readonly TrackChoice[];
  /** Takes a `MeasureProgress` at every step worth telling. */
  readonly port?: MessagePort;
}

export interface MeasureProgress {
  readonly stage: MeasureStage;
  /** 0–1 within the stage. */
  readonly progress: number;
}

export type MeasureJobResult =
  | {
      readonly outcome: 'measured';
      readonly facts: TakeFacts;
      /** In the order of `facts.pairs`; null where the pair has no kick hit. */
      readonly spectra: readonly (Uint8Array | null)[];
      /** Outlines as `encodePeaks` of dsp writes them, in the order of `facts.tracks`: what is stored of each track. */
      readonly peaks: readonly Uint8Array[];
      readonly files: readonly MeasuredFile[];
    }
  | { readonly outcome: 'refused'; readonly refusal: MeasureRefusalFacts };

/** Steps of progress that are told; finer ones would only be noise between threads. */
const progressStep = 0.02;

/**
 * Measures a take in a worker thread (for piscina: `filename` of this module, `name: 'measureJob'`).
 *
 * A refusal is a result, since an error loses its fields on the way to another thread.
 */
export async function measureJob(job: MeasureJob): Promise<MeasureJobResult> {
  try {
    const { take, files } = await measureFiles({
      files: job.paths.map((path) => ({ path })),
      tracks: job.tracks,
      onStage: progressTeller((progress) => job.port?.postMessage(progress)),
    });
    const spectra = take.pairSpectra.map((spectrum) => spectrum && encodePairSpectrum(spectrum));
    const peaks = take.peaks.map(encodePeaks);
    return { outcome: 'measured', facts: take.facts, spectra, peaks, files };
  } catch (error) {
    if (error instanceof MeasureRefusal) return { outcome: 'refused', refusal: error.toFacts() };
    throw error;
  } finally {
    job.port?.close();
  }
}

/** Tells each new stage, and progress within it in steps. */
function progressTeller(
  tell: (progress: MeasureProgress) => void,
): (stage: MeasureStage, progress: number) => void {
  let told: MeasureProgress | null = null;
  return (stage, progress) => {
    if (told?.stage === stage && progress - told.progress < progressStep) return;
    told = { stage, progress };
    tell(told);
  };
}
