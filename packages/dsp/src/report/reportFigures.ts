import { SignalError } from '../assert';
import type { PairFacts, TakeFacts, TrackFacts, TrackRole } from '../facts';
import { filesFindings } from '../findings/filesFindings';
import { findings } from '../findings/findings';
import { gainChangeDb, levelOf } from './level';
import { pathDifferenceM } from './pathDifference';
import type { AgreementReport, ArrivalReport, ReportFigures, Target, TrackReport } from './reportTypes';

export interface ReportFiguresOptions {
  readonly target: Target;
  /** Air temperature while recording. */
  readonly temperatureC: number;
}

/**
 * The facts of a take with what follows from its owner's target and temperature: level, gain change, path difference.
 *
 * The findings are told in metres; {@link findings} tells them anew for another reader.
 *
 * @throws {SignalError} `option` for a take without a kick and an overhead
 * @example
 * const hotter = reportFigures(facts, { target: { lowDbfs: -16, highDbfs: -10, aimDbfs: -12 }, temperatureC: 20 });
 * hotter.kick.level // 'hot'
 * hotter.kick.gainChangeDb // -5.418
 */
export function reportFigures(
  facts: TakeFacts,
  { target, temperatureC }: ReportFiguresOptions,
): ReportFigures {
  const places = { kick: placeOf(facts, 'kick'), overhead: placeOf(facts, 'overhead') };
  const pair = facts.pairs.find(({ a, b }) => a === places.kick && b === places.overhead);
  if (!pair) throw new SignalError('option', 'These facts hold no pair of kick and overhead.');
  const figures: ReportFigures = {
    version: facts.version,
    sampleRateHz: facts.sampleRateHz,
    durationS: facts.durationS,
    kick: trackReport(facts.tracks[places.kick], target),
    overhead: trackReport(facts.tracks[places.overhead], target),
    hits: facts.hits.map(({ timeS, kind, peaksDbfs }) => ({
      timeS,
      kind,
      kickPeakDbfs: peaksDbfs[places.kick] ?? null,
      overheadPeakDbfs: peaksDbfs[places.overhead] ?? null,
    })),
    lateStart: pair.lateStart ?? null,
    arrival: arrivalReport(pair, temperatureC),
    agreement: agreementReport(pair),
    balance: balanceReport(facts.balance),
    room: roomReport(facts.room),
    findings: filesFindings(facts.notices),
  };
  return { ...figures, findings: findings(figures, { lengthUnit: 'metre', target }) };
}

function placeOf(facts: TakeFacts, role: TrackRole): number {
  const place = facts.tracks.findIndex((track) => track.role === role);
  if (place < 0) throw new SignalError('option', `These facts hold no ${role}.`);
  return place;
}

function trackReport({ role: _role, ...track }: TrackFacts, target: Target): TrackReport {
  return {
    ...track,
    truePeakDbtp: track.truePeakDbtp ?? null,
    integratedLufs: track.integratedLufs ?? null,
    hum: track.hum ?? null,
    looksFlattened: track.looksFlattened ?? null,
    dropouts: track.dropouts ?? null,
    clipping: { ...track.clipping, runs: [...track.clipping.runs] },
    level: levelOf(track, target),
    gainChangeDb: gainChangeDb(track, target),
  };
}

function arrivalReport({ arrival }: PairFacts, temperatureC: number): ArrivalReport {
  const { arrivalMs } = arrival;
  return {
    ...arrival,
    pathDifferenceM: arrivalMs === null ? null : pathDifferenceM(arrivalMs, temperatureC),
  };
}

/** What each hit says is left out: it is for comparing takes. */
function balanceReport(balance: TakeFacts['balance']): ReportFigures['balance'] {
  if (!balance) return null;
  const { drumsLufs, cymbalsLufs, differenceDb, drumHits, cymbalHits, reason } = balance;
  return { drumsLufs, cymbalsLufs, differenceDb, drumHits, cymbalHits, reason };
}

function roomReport(room: TakeFacts['room']): ReportFigures['room'] {
  if (!room) return null;
  const { snareHits, decayS, earlyS, reason } = room;
  const bands = room.bands.map(({ centreHz, t20S, earlyS: bandEarlyS, earlyToLateDb }) => ({
    centreHz,
    t20S,
    earlyS: bandEarlyS,
    earlyToLateDb,
  }));
  return { snareHits, decayS, earlyS, bands, reason };
}

function agreementReport({ agreement }: PairFacts): AgreementReport {
  return {
    ...agreement,
    hitsAlike: agreement.hitsAlike ?? null,
    bands: [...agreement.bands],
    contraryBands: [...agreement.contraryBands],
    choices: [...agreement.choices],
  };
}
