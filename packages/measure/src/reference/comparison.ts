import { kWeighting } from '@thudline/dsp';
import type { ToolFigures } from './toolFigures';

export interface ComparisonRow {
  readonly figure: string;
  readonly tool: string;
  readonly ours: number;
  readonly theirs: number;
  readonly isWithin: boolean;
}

type Most = Readonly<Record<keyof ToolFigures, number>>;

const names: Readonly<Record<keyof ToolFigures, string>> = {
  samplePeakDbfs: 'sample peak, dBFS',
  rmsDbfs: 'RMS, dBFS',
  dcOffset: 'DC offset',
  truePeakDbtp: 'true peak, dBTP',
  integratedLufs: 'loudness, LUFS',
};

/**
 * How far two may lie apart: how the tools round (SoX two decimals, `ebur128` one); for the true peak also what four times
 * may read low near half the rate, 0.69 dB (BS.1770-5 Annex 2, 20·lg cos(π·0.5/4)), since the tools sample elsewhere;
 * for the loudness also the low cut that ffmpeg leaves unscaled at other rates (`f_ebur128.c`).
 */
function mostAt(sampleRateHz: number): Most {
  const [, lowCut] = kWeighting(sampleRateHz);
  return {
    samplePeakDbfs: 0.0051,
    rmsDbfs: 0.0051,
    dcOffset: 1e-6,
    truePeakDbtp: 0.05 + 0.69,
    integratedLufs: 0.06 + Math.abs(20 * Math.log10(lowCut.b0)),
  };
}

export interface Read {
  readonly tool: string;
  readonly figures: ToolFigures;
}

/** Our figures beside those of one tool; a figure that either can't tell is left out. */
export function comparison(ours: ToolFigures, read: Read, sampleRateHz: number): ComparisonRow[] {
  const most = mostAt(sampleRateHz);
  const keys = Object.keys(names) as (keyof ToolFigures)[];
  return keys.flatMap((key) => {
    const [own, other] = [ours[key], read.figures[key]];
    if (own === null || other === null) return [];
    const isWithin = Math.abs(own - other) <= most[key];
    return [{ figure: names[key], tool: read.tool, ours: own, theirs: other, isWithin }];
  });
}

/** One line of the table. */
export function comparisonText(row: ComparisonRow): string {
  const digits = row.figure === 'DC offset' ? 6 : 3;
  const cell = (value: number): string => value.toFixed(digits).padStart(12);
  const difference = cell(row.ours - row.theirs);
  return `  ${row.figure.padEnd(20)}${row.tool.padEnd(10)}${cell(row.ours)}${cell(row.theirs)}${difference}  ${
    row.isWithin ? 'pass' : 'FAIL'
  }`;
}
