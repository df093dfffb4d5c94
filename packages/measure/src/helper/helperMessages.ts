import type {
  OverheadFacts,
  OverheadRequest,
  PairPart,
  PairPartRequest,
  PassedTrack,
  ReadTrackOptions,
} from '@thudline/dsp/measuring';
import type { TrackChoice } from '../trackChoice';
import type { PackedHops } from './packedHops';

export interface OpenTake {
  readonly paths: readonly string[];
  readonly tracks: readonly TrackChoice[];
}

/** What the helper is asked to do. */
export type HelperTask =
  /** Of which take the steps after it are; another one's files are closed. */
  | ({ readonly task: 'open' } & OpenTake)
  | { readonly task: 'pass'; readonly track: number; readonly options: ReadTrackOptions }
  /** The main thread took a block of the pass that has this id, and hands its room back. */
  | { readonly task: 'taken'; readonly room: ArrayBuffer }
  | { readonly task: 'pair-part'; readonly request: PairPartRequest }
  | { readonly task: 'overhead'; readonly request: OverheadRequest }
  | { readonly task: 'close' };

/** `id` names the answers. */
export type HelperRequest = HelperTask & { readonly id: number };

/** What the helper says to a request; a pass is answered with many hops, then with what it found. */
export type HelperAnswer = { readonly id: number } & (
  | { readonly hops: PackedHops }
  | { readonly result: PassedTrack | PairPart | OverheadFacts | null }
  | { readonly error: Error }
);
