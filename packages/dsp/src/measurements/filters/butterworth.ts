/** Second-order section, a0 = 1: y = b0·x + b1·x₋₁ + b2·x₋₂ − a1·y₋₁ − a2·y₋₂. */
export interface Biquad {
  readonly b0: number;
  readonly b1: number;
  readonly b2: number;
  readonly a1: number;
  readonly a2: number;
}

interface SectionOptions {
  readonly sampleRateHz: number;
  readonly cutoffHz: number;
}

/** Damping of a second-order Butterworth section: Q = 1/√2, so that the response is −3.01 dB at the cutoff. */
const BUTTERWORTH_Q = Math.SQRT1_2;
/** A cutoff at or above half the sample rate has no meaning; this keeps the bilinear transform finite. */
const HIGHEST_CUTOFF_OF_RATE = 0.49;

/**
 * Second-order Butterworth low pass (12 dB per octave) by the bilinear transform, warped so that −3.01 dB lies at the
 * cutoff.
 *
 * @param options - rate > 0, cutoff > 0 (kept below half the rate)
 * @see R. Bristow-Johnson, "Cookbook formulae for audio EQ biquad filter coefficients" (W3C note, 2021)
 */
export function butterworthLowPass(options: SectionOptions): Biquad {
  const { cosine, alpha } = angles(options);
  const a0 = 1 + alpha;
  return {
    b0: (1 - cosine) / 2 / a0,
    b1: (1 - cosine) / a0,
    b2: (1 - cosine) / 2 / a0,
    a1: (-2 * cosine) / a0,
    a2: (1 - alpha) / a0,
  };
}

/** The high pass to {@link butterworthLowPass}: same order, same source, −3.01 dB at the cutoff. */
export function butterworthHighPass(options: SectionOptions): Biquad {
  const { cosine, alpha } = angles(options);
  const a0 = 1 + alpha;
  return {
    b0: (1 + cosine) / 2 / a0,
    b1: -(1 + cosine) / a0,
    b2: (1 + cosine) / 2 / a0,
    a1: (-2 * cosine) / a0,
    a2: (1 - alpha) / a0,
  };
}

/** A high pass and a low pass one after the other: what the measurements call a band. */
export function butterworthBand(band: {
  readonly sampleRateHz: number;
  readonly lowHz: number;
  readonly highHz: number;
}): [highPass: Biquad, lowPass: Biquad] {
  return [
    butterworthHighPass({ sampleRateHz: band.sampleRateHz, cutoffHz: band.lowHz }),
    butterworthLowPass({ sampleRateHz: band.sampleRateHz, cutoffHz: band.highHz }),
  ];
}

function angles({ sampleRateHz, cutoffHz }: SectionOptions): { cosine: number; alpha: number } {
  const cutoff = Math.min(cutoffHz, sampleRateHz * HIGHEST_CUTOFF_OF_RATE);
  const omega = (2 * Math.PI * cutoff) / sampleRateHz;
  return { cosine: Math.cos(omega), alpha: Math.sin(omega) / (2 * BUTTERWORTH_Q) };
}
