import { assertPositive } from '../../assert';
import type { Biquad } from '../filters/butterworth';

/** ITU-R BS.1770-5 Annex 1, as parameters (libebur128 `ebur128_init_filter`); at 48 kHz they give its Tables 1 and 2. */
const SHELF = { frequencyHz: 1681.974450955533, q: 0.7071752369554196, gainDb: 3.999843853973347 };
const SHELF_MIDDLE_POWER = 0.4996667741545416;
const LOW_CUT = { frequencyHz: 38.13547087602444, q: 0.5003270373238773 };
/** The tables are for this rate. */
const TABLE_RATE_HZ = 48000;

/**
 * The K-weighting of BS.1770-5 as two sections: a shelf that lifts what lies above 1.5 kHz by 4 dB, and a low cut.
 *
 * At other rates than 48 kHz the low cut's numerator is scaled so that the response stays what it is at 48 kHz, as the
 * text asks for; common tools leave it, and read 0.02 dB lower at 96 kHz.
 *
 * @param sampleRateHz - > 0; meant for 8 kHz and above
 * @returns the sections in order
 * @throws {SignalError} `option` for a rate that can't be
 * @see ITU-R BS.1770-5 (11/2023) Annex 1, Tables 1 and 2
 * @example
 * kWeighting(48000).length // 2
 */
export function kWeighting(sampleRateHz: number): [shelf: Biquad, lowCut: Biquad] {
  assertPositive(sampleRateHz, 'sampleRateHz');
  return [shelf(sampleRateHz), lowCut(sampleRateHz)];
}

interface Angles {
  /** tan(π·f/fs). */
  readonly k: number;
  readonly a0: number;
}

function angles({ frequencyHz, q }: { frequencyHz: number; q: number }, sampleRateHz: number): Angles {
  const k = Math.tan((Math.PI * frequencyHz) / sampleRateHz);
  return { k, a0: 1 + k / q + k * k };
}

function shelf(sampleRateHz: number): Biquad {
  const { k, a0 } = angles(SHELF, sampleRateHz);
  const top = Math.pow(10, SHELF.gainDb / 20);
  const middle = Math.pow(top, SHELF_MIDDLE_POWER);
  return {
    b0: (top + (middle * k) / SHELF.q + k * k) / a0,
    b1: (2 * (k * k - top)) / a0,
    b2: (top - (middle * k) / SHELF.q + k * k) / a0,
    a1: (2 * (k * k - 1)) / a0,
    a2: (1 - k / SHELF.q + k * k) / a0,
  };
}

function lowCut(sampleRateHz: number): Biquad {
  const { k, a0 } = angles(LOW_CUT, sampleRateHz);
  const scale = angles(LOW_CUT, TABLE_RATE_HZ).a0 / a0;
  return {
    b0: scale,
    b1: -2 * scale,
    b2: scale,
    a1: (2 * (k * k - 1)) / a0,
    a2: (1 - k / LOW_CUT.q + k * k) / a0,
  };
}
