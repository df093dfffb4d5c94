import { uploadLimits } from '@thudline/contracts';
import { WavError, lowEndRatio, openWav, type ByteSource } from '@thudline/dsp';
import type { FileReading } from './pickedFile';
import { limitWords, sizeWords } from './uploadWords';

/** A browser's File, read where it lies on the disk. */
export function fileSource(file: File): ByteSource {
  return {
    sizeBytes: file.size,
    read: async (start, end) => new Uint8Array(await file.slice(start, end).arrayBuffer()),
  };
}

/** Header and low end of a file, read in the browser; what the server would refuse is refused before it is sent. */
export async function readPickedFile(file: File): Promise<FileReading> {
  if (file.size > uploadLimits.maxFileBytes) {
    return {
      kind: 'refused',
      message: `This file has ${sizeWords(file.size)}; one file may have up to ${limitWords}. Export a shorter take.`,
    };
  }
  try {
    const wav = await openWav(fileSource(file));
    const sides = Array.from({ length: Math.min(2, wav.facts.channels) }, (_, channel) => wav.track(channel));
    const lowEndRatios = await Promise.all(sides.map((side) => lowEndRatio(side)));
    return { kind: 'ready', facts: wav.facts, lowEndRatios };
  } catch (error) {
    return { kind: 'refused', message: refusal(error) };
  }
}

/** Besides what isn't WAV: a folder, or a file that was moved or locked since it was dropped. */
function refusal(error: unknown): string {
  if (error instanceof WavError) return error.message;
  return 'This file could not be read from the disk. Drop it here again.';
}
