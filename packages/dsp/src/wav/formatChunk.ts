import type { SampleFormat } from './wavFacts';
import { WavError, cutOffHeader } from './wavError';

/** Limits of what is read (design: 8 kHz–384 kHz, 1–32 channels). */
export const wavLimits = { lowestRateHz: 8000, highestRateHz: 384_000, channels: 32 } as const;

/** Fewer bits a sample are no recording of a drum, but a damaged header. */
const leastBits = 8;

const pcmTag = 0x0001;
const floatTag = 0x0003;
const extensibleTag = 0xfffe;

/** Format tags met in the wild, as registered in mmreg.h (learn.microsoft.com). */
const tagNames: Readonly<Record<number, { name: string; lossy?: true }>> = {
  0x0002: { name: 'ADPCM' },
  0x0006: { name: 'A-law' },
  0x0007: { name: 'µ-law' },
  0x0011: { name: 'IMA ADPCM' },
  0x0031: { name: 'GSM', lossy: true },
  0x0050: { name: 'MPEG', lossy: true },
  0x0055: { name: 'MP3', lossy: true },
  0x00ff: { name: 'AAC', lossy: true },
  0x0161: { name: 'WMA', lossy: true },
  0x1610: { name: 'AAC', lossy: true },
  0x674f: { name: 'Ogg Vorbis', lossy: true },
};

/** Bytes 2–15 of every sub-format GUID that stands for a plain format tag (Microsoft's mmreg.h; as ffmpeg writes it). */
const guidTail = [0, 0, 0, 0, 0x10, 0, 0x80, 0, 0, 0xaa, 0, 0x38, 0x9b, 0x71];

/**
 * How the samples lie, read from the body of a `fmt ` chunk and checked: nothing in it is trusted.
 *
 * @param body - at least the 16 bytes every fmt chunk has
 * @throws {WavError} what can't be read, by name
 */
export function sampleFormat(body: DataView): SampleFormat {
  if (body.byteLength < 16) throw cutOffHeader();
  const channels = body.getUint16(2, true);
  const sampleRateHz = body.getUint32(4, true);
  const blockAlign = body.getUint16(12, true);
  const declaredBits = body.getUint16(14, true);
  const encoding = encodingOf(formatTag(body));
  checkLimits(channels, sampleRateHz);
  const bitsPerSample = containerBits({ encoding, channels, blockAlign, declaredBits });
  const validBits = validBitsOf(body, encoding, declaredBits);
  return { encoding, bitsPerSample, validBits, channels, sampleRateHz, blockAlign };
}

/** @returns the plain tag, looked up in the sub-format where the chunk is extensible */
function formatTag(body: DataView): number {
  const tag = body.getUint16(0, true);
  if (tag !== extensibleTag) return tag;
  if (body.byteLength < 40) throw cutOffHeader();
  if (!guidTail.every((byte, i) => body.getUint8(26 + i) === byte)) {
    throw new WavError(
      'encoding',
      'This WAV holds an unknown kind of sound; export it as plain PCM WAV instead.',
    );
  }
  return body.getUint16(24, true);
}

function encodingOf(tag: number): 'pcm' | 'float' {
  if (tag === pcmTag) return 'pcm';
  if (tag === floatTag) return 'float';
  const known = tagNames[tag];
  if (known?.lossy) {
    throw new WavError(
      'lossy',
      `This WAV holds ${known.name} sound; lossy files shift time and hide clipping, so export plain PCM WAV.`,
    );
  }
  const name = known?.name ?? `an unknown kind of (0x${tag.toString(16).padStart(4, '0')})`;
  throw new WavError('encoding', `This WAV holds ${name} sound; export it as plain PCM WAV instead.`);
}

function checkLimits(channels: number, sampleRateHz: number): void {
  if (channels === 0 || channels > wavLimits.channels) {
    throw new WavError(
      'channels',
      `This WAV claims ${channels} channels; export one with 1 to ${wavLimits.channels}, best one file a microphone.`,
    );
  }
  if (sampleRateHz < wavLimits.lowestRateHz || sampleRateHz > wavLimits.highestRateHz) {
    throw new WavError(
      'rate',
      `This WAV claims ${sampleRateHz} Hz; export it at 44,100 or 48,000 Hz instead.`,
    );
  }
}

/** The container is what lies between two samples; it must be the smallest whole number of bytes for its bits. */
function containerBits(format: {
  encoding: 'pcm' | 'float';
  channels: number;
  blockAlign: number;
  declaredBits: number;
}): number {
  const bytes = Math.ceil(format.declaredBits / 8);
  const readable = format.encoding === 'pcm' ? [1, 2, 3, 4] : [4, 8];
  if (
    !readable.includes(bytes) ||
    format.declaredBits < leastBits ||
    (format.encoding === 'float' && format.declaredBits % 8 !== 0)
  ) {
    throw new WavError(
      'encoding',
      `This WAV holds ${format.declaredBits}-bit ${format.encoding === 'pcm' ? 'PCM' : 'float'} samples; export it as 24-bit PCM instead.`,
    );
  }
  if (format.blockAlign !== bytes * format.channels) {
    throw new WavError(
      'damaged',
      `This WAV's header contradicts itself (${format.declaredBits}-bit samples, ${format.channels} channels, ${format.blockAlign} bytes a frame); export it again as 24-bit PCM.`,
    );
  }
  return bytes * 8;
}

/** Extensible files say how many bits carry sound; 0 or nonsense there means all of them. */
function validBitsOf(body: DataView, encoding: 'pcm' | 'float', declaredBits: number): number {
  if (encoding === 'float' || body.getUint16(0, true) !== extensibleTag) return declaredBits;
  const valid = body.getUint16(18, true);
  return valid >= leastBits && valid <= declaredBits ? valid : declaredBits;
}
