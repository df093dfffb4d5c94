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
