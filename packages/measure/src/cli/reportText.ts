import type { Finding, Hit, LateStart, LineSentence, ReportFigures, TrackReport } from '@thudline/contracts';
import type { MeasuredFile } from '../measureFiles';
import type { TrackChoice } from '../trackChoice';

export interface ReportTextOptions {
  readonly line: readonly LineSentence[];
  readonly figures: ReportFigures;
  readonly files: readonly MeasuredFile[];
  readonly tracks: readonly TrackChoice[];
}

const statusWords: Readonly<Record<Finding['status'], string>> = {
  good: 'good',
  watch: 'watch',
  fix: 'fix',
  'cannot-tell': "can't tell",
};

/**
 * A report for a terminal: the line and the findings as sentences first, then the figures with their units.
 *
 * @returns lines of text, ending with a line break
 */
export function reportText(options: ReportTextOptions): string {
  const { figures, line } = options;
  const sections = [
    fileLines(options),
    line.map(({ action, reason }) => `${action} ${reason}`),
    figures.findings.flatMap(findingLines),
    levelLines(figures),
    ...(figures.lateStart ? [lateStartLines(figures.lateStart)] : []),
    arrivalLines(figures),
    agreementLines(figures),
    hitLines(figures.hits),
  ];
  return `${sections.map((lines) => lines.join('\n')).join('\n\n')}\n`;
}

function fileLines({ files, tracks }: ReportTextOptions): string[] {
  return tracks.flatMap(({ role, fileIndex, channel }) => {
    const file = files.at(fileIndex);
    if (!file) return [];
    const { path, facts } = file;
    const where = facts.channels > 1 ? `, channel ${channel} of ${facts.channels}` : '';
    return `${role.padEnd(10)}${path}${where} (${facts.encodingName}, ${facts.sampleRateHz} Hz, ${facts.durationS.toFixed(2)} s)`;
  });
}

function findingLines({ status, sentence, why, next }: Finding): string[] {
  const rest = [why, next].filter((text) => text !== '').join(' ');
  return [`${statusWords[status].padEnd(12)}${sentence}`, ...(rest ? [`${' '.repeat(12)}${rest}`] : [])];
}

function levelLines({ kick, overhead }: ReportFigures): string[] {
  const row = (name: string, value: (track: TrackReport) => string) =>
    `${name.padEnd(30)}${value(kick).padEnd(26)}${value(overhead)}`;
  return [
    row('Levels', (track) => (track === kick ? 'kick' : 'overhead')),
    row('  hardest hit', (track) => unit(track.loudestHitDbfs, 'dBFS')),
    row('  level', (track) => track.level ?? '–'),
    row('  change at the preamp', (track) => signed(track.gainChangeDb, 'dB')),
    row('  sample peak', (track) => `${unit(track.samplePeakDbfs, 'dBFS')}${place(track.samplePeakAtS)}`),
    row('  true peak (BS.1770-5)', (track) => unit(track.truePeakDbtp, 'dBTP')),
    row('  headroom', (track) => unit(track.headroomDb, 'dB')),
    row('  RMS (full-scale sine −3.01)', (track) => unit(track.rmsDbfs, 'dBFS')),
    row('  crest factor', (track) => unit(track.crestFactorDb, 'dB')),
    row('  loudness (BS.1770-5)', (track) => unit(track.integratedLufs, 'LUFS')),
    row('  clipping', ({ clipping }) =>
      clipping.runCount === 0 ? 'none' : `${clipping.runCount} runs, ${clipping.clippedSamples} samples`,
    ),
    row('  looks squashed', ({ looksFlattened }) =>
      looksFlattened === null ? '–' : looksFlattened ? 'yes' : 'no',
    ),
    row('  dropouts', ({ dropouts }) =>
      dropouts === null ? '–' : `${dropouts.count}${place(dropouts.firstAtS)}`,
    ),
    row('  DC offset', (track) => minus(track.dcOffset.toFixed(6))),
    row('  noise floor', (track) =>
      track.noiseFloorDbfs === null
        ? `– (${track.noiseFloorReason ?? ''})`
        : unit(track.noiseFloorDbfs, 'dBFS'),
    ),
    row('  hum', ({ hum }) => (hum === null ? '–' : `${unit(hum.levelDbfs, 'dBFS')} (${hum.mainsHz} Hz)`)),
  ];
}

function lateStartLines({ overheadLateMs, likeness }: LateStart): string[] {
  return [
    'Start of the files',
    `  overhead file runs late by  ${unit(overheadLateMs, 'ms')}`,
    `  likeness once lined up      ${likeness.toFixed(2)} of 1`,
  ];
}

function arrivalLines({ arrival }: ReportFigures): string[] {
  return [
    'Arrival (overhead after kick)',
    `  arrival                     ${unit(arrival.arrivalMs, 'ms')}${reason(arrival.reason)}`,
    `  spread over hits (IQR)      ${unit(arrival.arrivalIqrMs, 'ms')}, ${arrival.hitsUsed} hits`,
    `  path difference             ${unit(arrival.pathDifferenceM, 'm')}`,
    `  confidence                  ${arrival.confidence.toFixed(2)} of 1`,
    `  first swing                 kick ${arrival.firstSwing.kick ?? '–'}, overhead ${arrival.firstSwing.overhead ?? '–'}`,
  ];
}

function agreementLines({ agreement }: ReportFigures): string[] {
  const choices = agreement.choices.map(({ name, shiftMs, lowEndDb, deepest }) => {
    const dip = deepest
      ? `, deepest ${signed(deepest.levelDb, 'dB')} at ${Math.round(deepest.centreHz)} Hz`
      : '';
    return `  ${name.padEnd(28)}low end ${signed(lowEndDb, 'dB')}, ${unit(shiftMs, 'ms')} earlier${dip}`;
  });
  return [
    'Adding up (30–150 Hz)',
    `  verdict                     ${agreement.verdict}${agreement.sure ? '' : ', unsure'}${reason(agreement.reason)}`,
    `  flip, levels matched        ${signed(agreement.flipGainMatchedDb, 'dB')}`,
    `  flip, as recorded           ${signed(agreement.flipGainRecordedDb, 'dB')}`,
    `  overhead raised to match    ${signed(agreement.matchGainDb, 'dB')}`,
    `  low correlation             ${agreement.lowCorrelation === null ? '–' : minus(agreement.lowCorrelation.toFixed(2))}`,
    `  hits that agree             ${agreement.agreeingHits} of ${agreement.hitsUsed}`,
    ...choices,
  ];
}

function hitLines(hits: readonly Hit[]): string[] {
  const kinds = ['kick', 'drum', 'cymbal', 'mixed'] as const;
  const counts = kinds
    .map((kind) => ({ kind, count: hits.filter((hit) => hit.kind === kind).length }))
    .filter(({ count }) => count > 0)
    .map(({ kind, count }) => `${count} ${kind}`);
  return [`Hits  ${hits.length}${counts.length > 0 ? ` (${counts.join(', ')})` : ''}`];
}

function unit(value: number | null, name: string): string {
  return value === null ? '–' : `${minus(value.toFixed(2))} ${name}`;
}

function signed(value: number | null, name: string): string {
  return value === null ? '–' : `${value > 0 ? '+' : ''}${unit(value, name)}`;
}

function place(seconds: number | null): string {
  return seconds === null ? '' : ` at ${seconds.toFixed(3)} s`;
}

/** Reasons are codes for programs; as words they read well enough here. */
function reason(code: string | null): string {
  return code === null ? '' : ` (${code.replaceAll('-', ' ')})`;
}

function minus(text: string): string {
  return text.replace('-', '−');
}
