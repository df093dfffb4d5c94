import type { TrackSource } from '../../trackSource';

/**
 * A track whose places are read as if it had begun earlier or later, so that two files line up hit by hit.
 *
 * @param samples - whole; positive plays it earlier
 * @returns the track with moved reads; `frames` and `blocks` stay those of the file
 */
export function playedEarlier(track: TrackSource, samples: number): TrackSource {
  return {
    ...track,
    blocks: () => track.blocks(),
    read: (startFrame, endFrame, into) => track.read(startFrame + samples, endFrame + samples, into),
  };
}
