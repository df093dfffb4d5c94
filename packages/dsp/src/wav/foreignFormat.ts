import { ascii } from './byteWindow';
import { WavError } from './wavError';

const lossyAdvice = 'lossy files shift time and hide clipping, so export WAV from the recording itself.';

/** First bytes of files that are not WAV (each format's own published magic number). */
const magics: readonly { at: number; bytes: string; code: 'lossy' | 'container'; name: string }[] = [
  { at: 0, bytes: 'ID3', code: 'lossy', name: 'an MP3 file' },
  { at: 0, bytes: 'OggS', code: 'lossy', name: 'an Ogg file' },
  { at: 4, bytes: 'ftyp', code: 'lossy', name: 'an AAC (M4A or MP4) file' },
  { at: 0, bytes: 'ADIF', code: 'lossy', name: 'an AAC file' },
  { at: 0, bytes: '\x30\x26\xb2\x75', code: 'lossy', name: 'a WMA file' },
  { at: 0, bytes: '\x1a\x45\xdf\xa3', code: 'lossy', name: 'a WebM or Matroska file' },
  { at: 0, bytes: 'fLaC', code: 'container', name: 'a FLAC file' },
  { at: 0, bytes: 'FORM', code: 'container', name: 'an AIFF file' },
  { at: 0, bytes: 'caff', code: 'container', name: 'a CAF file' },
  { at: 0, bytes: 'RIFX', code: 'container', name: 'a RIFX file (a WAV with its bytes the other way round)' },
  { at: 0, bytes: 'riff', code: 'container', name: 'a Wave64 file' },
  { at: 0, bytes: '.snd', code: 'container', name: 'an AU file' },
  { at: 0, bytes: 'wvpk', code: 'container', name: 'a WavPack file' },
  { at: 0, bytes: 'MAC ', code: 'container', name: "a Monkey's Audio file" },
];

/**
 * The refusal of a file that is not WAV, by name where its first bytes tell.
 *
 * @param head - the first bytes of the file, 12 are enough
 */
export function foreignFormat(head: DataView): WavError {
  const found = magics.find((magic) => ascii(head, magic.at, magic.bytes.length) === magic.bytes);
  if (found?.code === 'lossy') return new WavError('lossy', `This is ${found.name}; ${lossyAdvice}`);
  if (found)
    return new WavError(
      'container',
      `This is ${found.name}, which isn't read here; export it as WAV instead.`,
    );
  const stream = mpegStream(head);
  if (stream) return new WavError('lossy', `This is ${stream}; ${lossyAdvice}`);
  return new WavError('not-wav', "This isn't a WAV file; export the take as WAV, 24-bit if you can.");
}

/** MPEG audio begins with eleven set bits (ISO/IEC 11172-3, 2.4.1.3); ADTS AAC with twelve and layer 0 (13818-7). */
function mpegStream(head: DataView): string | null {
  if (head.byteLength < 2 || head.getUint8(0) !== 0xff) return null;
  const second = head.getUint8(1);
  if ((second & 0xf6) === 0xf0) return 'an AAC file';
  // Layers III and II only: 0xFF 0xFE would be layer I, but also opens every UTF-16 text.
  return (second & 0xe0) === 0xe0 && [0x02, 0x04].includes(second & 0x06) ? 'an MP3 file' : null;
}
