/** What another tool reads of one microphone; null where it tells no finite number, as for silence. */
export interface ToolFigures {
  readonly samplePeakDbfs: number | null;
  readonly rmsDbfs: number | null;
  readonly dcOffset: number | null;
  readonly truePeakDbtp: number | null;
  readonly integratedLufs: number | null;
}

/**
 * Reads what ffmpeg's `ebur128=peak=true` and `astats` print at the end of a run on one channel.
 *
 * @param text - standard error of ffmpeg 5.1; `ebur128` prints one decimal, and −70.0 LUFS for nothing above the gate
 */
export function ffmpegFigures(text: string): ToolFigures {
  const summary = text.slice(Math.max(0, text.lastIndexOf('Summary:')));
  const loudness = after(summary, /\bI: +(\S+) LUFS/);
  return {
    samplePeakDbfs: after(text, /Peak level dB: (\S+)/),
    rmsDbfs: after(text, /RMS level dB: (\S+)/),
    dcOffset: after(text, /DC offset: (\S+)/),
    truePeakDbtp: after(summary, /True peak:\s+Peak: +(\S+) dBFS/),
    integratedLufs: loudness === -70 ? null : loudness,
  };
}

/** Reads what SoX's `stats` prints for one channel, two decimals; it has neither true peak nor loudness. */
export function soxFigures(text: string): ToolFigures {
  return {
    samplePeakDbfs: after(text, /Pk lev dB +(\S+)/),
    rmsDbfs: after(text, /RMS lev dB +(\S+)/),
    dcOffset: after(text, /DC offset +(\S+)/),
    truePeakDbtp: null,
    integratedLufs: null,
  };
}

function after(text: string, pattern: RegExp): number | null {
  const found = pattern.exec(text)?.[1];
  const value = found === undefined ? NaN : Number(found);
  return Number.isFinite(value) ? value : null;
}
