/** Why a file was refused, for programs. */
export type WavRefusal =
  | 'not-wav'
  | 'empty'
  | 'cut-off'
  | 'no-frames'
  | 'lossy'
  | 'encoding'
  | 'container'
  | 'rate'
  | 'channels'
  | 'damaged';

/**
 * A file that can't be measured. The message is one sentence for people, without the file's name: what was found and
 * what to export instead.
 */
export class WavError extends Error {
  override readonly name = 'WavError';

  constructor(
    readonly code: WavRefusal,
    message: string,
  ) {
    super(message);
  }
}

/** @returns the refusal of a file that ends before its header does */
export function cutOffHeader(): WavError {
  return new WavError('cut-off', "This WAV's header is cut off; copy the file again or export it anew.");
}
