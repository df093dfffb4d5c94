import type { TakeMeasurement, WavFacts } from '@thudline/dsp';
import { measureTake, type MeasureStage } from '@thudline/dsp/measuring';
import { takeHelper, type TakeHelper } from './helper/takeHelper';
import { withOpenFiles } from './openFiles';
import { chosenTracks, headerNotices, type TrackChoice } from './trackChoice';

export interface MeasureFilesOptions {
  readonly files: readonly { readonly path: string }[];
  /** One kick and one overhead; both may be channels of one file. */
  readonly tracks: readonly TrackChoice[];
  /** Called as the work goes on; `progress` is 0–1 within the stage. */
  readonly onStage?: (stage: MeasureStage, progress: number) => void;
  /** Stops the work at the next step; the promise is rejected with its reason. */
  readonly signal?: AbortSignal;
}

export interface MeasuredFile {
  readonly path: string;
  readonly sizeBytes: number;
  readonly facts: WavFacts;
}

export interface MeasuredFiles {
  readonly take: TakeMeasurement;
  /** In the order they were given. */
  readonly files: readonly MeasuredFile[];
}

/**
 * Measures the microphones of one take from files on a disk, in memory that doesn't grow with their length.
 *
 * Files of different lengths are measured over the shorter one, with a notice.
 *
 * @throws {MeasureRefusal} files that can't be measured, or not together
 */
export async function measureFiles(options: MeasureFilesOptions): Promise<MeasuredFiles> {
  options.signal?.throwIfAborted();
  const paths = options.files.map(({ path }) => path);
  return withHelper((helper) =>
    withOpenFiles(paths, async (files) => {
      const take = await measureTake({
        tracks: chosenTracks(files, options.tracks),
        notices: headerNotices(files, options.tracks),
        beside: helper?.steps({ paths, tracks: options.tracks }),
        onStage(stage, progress) {
          options.signal?.throwIfAborted();
          options.onStage?.(stage, progress);
        },
      });
      return {
        take,
        files: files.map(({ path, source, wav }) => ({
          path,
          sizeBytes: source.sizeBytes,
          facts: wav.facts,
        })),
      };
    }),
  );
}

/** Started before anything else, since a thread takes a while until it can do something. */
async function withHelper<Result>(use: (helper: TakeHelper | null) => Promise<Result>): Promise<Result> {
  const helper = takeHelper();
  try {
    const result = await use(helper);
    helper?.rest();
    return result;
  } catch (error) {
    helper?.end();
    throw error;
  }
}
