import { assertPositive } from '../../assert';
import { ratioDb } from '../agreement/choiceEnergy';
import { createButterworthEnergy } from '../filters/bandEnergy';

/** The beater's click against the drum's weight (measurements.md, 8); filters settle over ten periods of their low edge before. */
const CLICK = { lowHz: 2000, highHz: 6000, lengthS: 0.02, settleS: 0.005 };
const WEIGHT = { lowHz: 40, highHz: 150, lengthS: 0.2, settleS: 0.25 };

/**
 * Attack of one kick hit: 2–6 kHz energy of its first 20 ms against 40–150 Hz energy of its first 200 ms.
 *
 * @param samples - the kick microphone, from some milliseconds before the hit to at least 200 ms after
 * @param options.startAt - index of the hit's first sound
 * @returns dB, the higher the more click; null where either band is silent or the hit is cut off
 * @throws {SignalError} `option` for a rate that can't be
 * @example
 * const source = await file.track(0).read(24000, 48000);
 * attackDb(source, { sampleRateHz: 48000, startAt: 1 }) // -55.827
 */
export function attackDb(
  samples: Float32Array,
  { sampleRateHz, startAt }: { readonly sampleRateHz: number; readonly startAt: number },
): number | null {
  assertPositive(sampleRateHz, 'sampleRateHz');
  if (startAt < 0 || startAt + Math.round(WEIGHT.lengthS * sampleRateHz) > samples.length) return null;
  const energy = ({ lowHz, highHz, lengthS, settleS }: typeof CLICK): number => {
    const from = Math.max(0, startAt - Math.round(settleS * sampleRateHz));
    const band = createButterworthEnergy({ sampleRateHz, lowHz, highHz });
    band.next(samples, from, startAt);
    return band.next(
      samples,
      startAt,
      Math.min(samples.length, startAt + Math.round(lengthS * sampleRateHz)),
    );
  };
  return ratioDb(energy(CLICK), energy(WEIGHT));
}
