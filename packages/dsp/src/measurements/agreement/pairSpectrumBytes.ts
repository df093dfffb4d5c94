import { SignalError } from '../../assert';
import type { PairSpectrum } from '../../facts';

const PARTS = ['skk', 'soo', 'skoRe', 'skoIm'] as const;
const BYTES_PER_VALUE = 4;

/**
 * Little-endian float32, `binCount` values each of Skk, Soo, Re Sko and Im Sko: what is stored and sent.
 * @example
 * encodePairSpectrum(spectrum).length // 65552
 */
export function encodePairSpectrum(spectrum: PairSpectrum): Uint8Array {
  const binCount = spectrum.skk.length;
  const view = new DataView(new ArrayBuffer(PARTS.length * binCount * BYTES_PER_VALUE));
  PARTS.forEach((part, index) => {
    spectrum[part].forEach((value, bin) => {
      view.setFloat32((index * binCount + bin) * BYTES_PER_VALUE, value, true);
    });
  });
  return new Uint8Array(view.buffer);
}

/**
 * The inverse of {@link encodePairSpectrum}.
 *
 * @throws {SignalError} `length` where the bytes don't hold four times `binCount` values
 * @example
 * const stored = encodePairSpectrum(spectrum);
 * decodePairSpectrum(stored, { binHz: spectrum.binHz, binCount: 4097, hitCount: 8 }).hitCount // 8
 */
export function decodePairSpectrum(
  bytes: Uint8Array,
  {
    binHz,
    binCount,
    hitCount,
  }: { readonly binHz: number; readonly binCount: number; readonly hitCount: number },
): PairSpectrum {
  if (bytes.byteLength !== PARTS.length * binCount * BYTES_PER_VALUE) {
    throw new SignalError(
      'length',
      `A pair spectrum of ${binCount} bins isn't ${bytes.byteLength} bytes long.`,
    );
  }
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const part = (index: number): Float32Array =>
    Float32Array.from({ length: binCount }, (_, bin) =>
      view.getFloat32((index * binCount + bin) * BYTES_PER_VALUE, true),
    );
  return { binHz, hitCount, skk: part(0), soo: part(1), skoRe: part(2), skoIm: part(3) };
}
