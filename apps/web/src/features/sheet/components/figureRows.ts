import type { ReportResponse, TrackReport, UserSettings } from '@thudline/contracts';
import { clock, distance, missing, number, signed } from '../../../lib/format';
import { overheadGroups } from './overheadFigures';

export interface FigureRow {
  label: string;
  unit: string;
  /** One value, or kick and overhead. */
  values: string[];
  definition: string;
  source: string;
}

export interface FigureGroup {
  title: string;
  columns: string[];
  rows: FigureRow[];
  /** Left out on paper, where two pages must do; its main figures stand in its section. */
  onScreenOnly?: boolean;
}

const ownDefinition = 'our definition';
const orMissing = (value: number | null, digits: number) =>
  value === null ? missing : number(value, digits);

interface TrackRow extends Omit<FigureRow, 'values'> {
  of: (track: TrackReport) => string;
}

const trackRows: TrackRow[] = [
  {
    label: 'Hardest hit',
    unit: 'dBFS',
    of: (t) => orMissing(t.loudestHitDbfs, 2),
    definition: 'Largest sample at any hit found. The level is judged by this, not by a knocked stand.',
    source: ownDefinition,
  },
  {
    label: 'Sample peak',
    unit: 'dBFS',
    of: (t) => orMissing(t.samplePeakDbfs, 2),
    definition: 'Largest absolute sample of the file, full scale 1.',
    source: 'peak-referenced dBFS',
  },
  {
    label: 'Peak at',
    unit: 'min:s',
    of: (t) => (t.samplePeakAtS === null ? missing : clock(t.samplePeakAtS, true)),
    definition: 'Where the largest sample stands.',
    source: ownDefinition,
  },
  {
    label: 'True peak',
    unit: 'dBTP',
    of: (t) => orMissing(t.truePeakDbtp, 2),
    definition:
      'How high the wave goes between samples: interpolated 4 times below 96 kHz, 2 times below 192; never below the sample peak.',
    source: 'ITU-R BS.1770-5, Annex 2',
  },
  {
    label: 'Headroom',
    unit: 'dB',
    of: (t) => orMissing(t.headroomDb, 2),
    definition: 'From the sample peak up to full scale.',
    source: ownDefinition,
  },
  {
    label: 'Change at the preamp',
    unit: 'dB',
    of: (t) =>
      t.gainChangeDb === null
        ? missing
        : `${signed(t.gainChangeDb, 2)}${t.level === 'clipped' ? ' or more' : ''}`,
    definition:
      'From the hardest hit to the aim. Clipped hits were higher than what was written, so it says at least.',
    source: 'aim: common practice, no source',
  },
  {
    label: 'Clipped places',
    unit: '',
    of: (t) => `${t.clipping.runCount}`,
    definition:
      'Three or more samples in a row, of one sign, within two quantisation steps of full scale; and tops that stand still for four samples below it, near the take’s own peak, in two places or more.',
    source: 'common practice, no source',
  },
  {
    label: 'Clipped samples',
    unit: '',
    of: (t) => `${t.clipping.clippedSamples}`,
    definition: 'Samples in those places.',
    source: 'common practice, no source',
  },
  {
    label: 'Looks squashed',
    unit: '',
    of: (t) => (t.looksFlattened === null ? missing : t.looksFlattened ? 'yes' : 'no'),
    definition:
      'Three places or more near the peak where three samples lie within 0.4 %, entered and left by steps four times as large. Never called clipped.',
    source: ownDefinition,
  },
  {
    label: 'Dropouts',
    unit: '',
    of: (t) => (t.dropouts === null ? missing : `${t.dropouts.count}`),
    definition:
      'Sound that stops at zero and comes back from one sample to the next, or a jump no wave makes.',
    source: ownDefinition,
  },
  {
    label: 'RMS',
    unit: 'dBFS',
    of: (t) => orMissing(t.rmsDbfs, 2),
    definition:
      'Root mean square of the whole take. A full-scale sine reads −3.01; the AES17 convention is 3.01 dB higher.',
    source: 'peak-referenced dBFS',
  },
  {
    label: 'Crest factor',
    unit: 'dB',
    of: (t) => orMissing(t.crestFactorDb, 2),
    definition: 'Sample peak minus RMS.',
    source: ownDefinition,
  },
  {
    label: 'Loudness',
    unit: 'LUFS',
    of: (t) => orMissing(t.integratedLufs, 2),
    definition:
      'Integrated and gated, this microphone as one channel of weight 1. Quiet stretches don’t count.',
    source: 'ITU-R BS.1770-5, Annex 1',
  },
  {
    label: 'Noise floor',
    unit: 'dBFS',
    of: (t) => orMissing(t.noiseFloorDbfs, 2),
    definition: 'RMS of the quietest steady second. Without such a second it can’t be told.',
    source: ownDefinition,
  },
  {
    label: 'Hum',
    unit: 'dBFS',
    of: (t) => (t.hum === null ? missing : `${number(t.hum.levelDbfs, 2)} (${t.hum.mainsHz} Hz)`),
    definition:
      'RMS of the mains’ multiples in that second: at least three of the first eight of 50 or 60 Hz, one of them the first or second, 10 dB over what lies 4–12 Hz away.',
    source: ownDefinition,
  },
  {
    label: 'DC offset',
    unit: '% of full scale',
    of: (t) => number(t.dcOffset * 100, 4),
    definition: 'Mean of all samples.',
    source: ownDefinition,
  },
];

function pairRows({ arrival, agreement, lateStart }: ReportResponse, settings: UserSettings): FigureRow[] {
  const one = (
    label: string,
    unit: string,
    value: string,
    definition: string,
    source = ownDefinition,
  ): FigureRow => ({
    label,
    unit,
    values: [value],
    definition,
    source,
  });
  const path =
    arrival.pathDifferenceM === null ? missing : distance(arrival.pathDifferenceM, settings.lengthUnit);
  return [
    one(
      'Arrival',
      'ms',
      orMissing(arrival.arrivalMs, 2),
      'How much later the overhead hears the kick: median over hits.',
      'first arrival and Knapp & Carter 1976',
    ),
    one('Arrival, spread', 'ms', orMissing(arrival.arrivalIqrMs, 2), 'Interquartile range over hits.'),
    one('Arrival', 'samples', orMissing(arrival.arrivalSamples, 1), 'The same at this file’s sample rate.'),
    one(
      'Arrival, confidence',
      '0–1',
      number(arrival.confidence, 2),
      'From the agreement of two methods and the spread over hits.',
    ),
    one(
      'Overhead file runs late by',
      'ms',
      lateStart === null ? missing : signed(lateStart.overheadLateMs, 0),
      'Where onsets below 150 Hz line up, if that is 20 ms away or more, within 5 ms; – where nothing shows it.',
    ),
    one(
      'Path difference',
      'about',
      path,
      'Arrival times the speed of sound at your temperature, 331.3·√(1 + t/273.15) m/s.',
      'dry-air formula',
    ),
    one(
      'Low correlation',
      '−1 … +1',
      orMissing(agreement.lowCorrelation, 3),
      'Of the two microphones between 30 and 150 Hz, over all kick hits.',
    ),
    one(
      'Flip, levels matched',
      'dB',
      agreement.flipGainMatchedDb === null ? missing : signed(agreement.flipGainMatchedDb, 2),
      'What flipping does to the energy of the two added, 30–150 Hz, with the overhead turned up to match.',
    ),
    one(
      'Flip, as recorded',
      'dB',
      agreement.flipGainRecordedDb === null ? missing : signed(agreement.flipGainRecordedDb, 2),
      'The same at the levels in the files.',
    ),
    one(
      'Match gain',
      'dB',
      agreement.matchGainDb === null ? missing : signed(agreement.matchGainDb, 2),
      'What the overhead is turned up by for “levels matched”.',
    ),
    one(
      'Kick hits that agree',
      '',
      `${agreement.agreeingHits} of ${agreement.hitsUsed}`,
      'Hits whose own low end says the same as all of them together. Below three in four nothing is told.',
    ),
    one(
      'Kick hits alike',
      '0–1',
      orMissing(agreement.hitsAlike, 2),
      'Coherence over the hits, 30–150 Hz. Files of two passes reach about 0.9 by the root of their number.',
    ),
  ];
}

/** Every figure of a report with unit, definition and source, two decimals. */
export function figureGroups(report: ReportResponse, settings: UserSettings): FigureGroup[] {
  return [
    {
      title: 'Levels',
      columns: ['kick', 'overhead'],
      rows: trackRows.map(({ of, ...row }) => ({ ...row, values: [of(report.kick), of(report.overhead)] })),
    },
    { title: 'Adding up', columns: ['kick and overhead'], rows: pairRows(report, settings) },
    ...overheadGroups(report),
  ];
}
