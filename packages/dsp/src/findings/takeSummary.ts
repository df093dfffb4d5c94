import { levelStatus, NOISE_WATCH_DBFS } from '../report/level';
import type { ReportFigures, TakeSummary, TrackReport } from '../report/reportTypes';
import { addingUpStatus } from './addingUpFinding';
import { loudHum } from './humFindings';
import { noisierMicrophone } from './noiseFinding';
import { capitalised, countText, halfDbText, wholeDbfsText, wholeMsText } from './words';

const ROLES = ['kick', 'overhead'] as const;

/**
 * One short sentence or two for the table of takes: the most important thing heavy, the next beside it.
 * @example
 * takeSummary(figures).strong // 'Flip the overhead.'
 */
export function takeSummary(figures: ReportFigures): TakeSummary {
  return (
    clipped(figures) ??
    missing(figures) ??
    lateStart(figures) ??
    droppedOut(figures) ??
    flip(figures) ??
    gain(figures) ??
    squashed(figures) ??
    noise(figures) ??
    unsure(figures) ??
    good(figures)
  );
}

function clipped(figures: ReportFigures): TakeSummary | null {
  const role = ROLES.find((each) => figures[each].level === 'clipped');
  if (!role) return null;
  const { runCount } = figures[role].clipping;
  return {
    status: 'fix',
    strong: runCount === 1 ? 'Clipped in one place.' : `Clipped in ${countText(runCount)} places.`,
    rest: `${capitalised(role)} down ${halfDbText(figures[role].gainChangeDb ?? 0)} dB or more.`,
  };
}

function missing(figures: ReportFigures): TakeSummary | null {
  const silent = ROLES.find((role) => figures[role].samplePeakDbfs === null);
  if (silent) return { status: 'cannot-tell', strong: `The ${silent} is silent.`, rest: 'Check its cable.' };
  if (figures.agreement.reason !== 'no-kick-hits') return null;
  return { status: 'cannot-tell', strong: 'No kick hit found.', rest: 'Play eight hard ones.' };
}

function lateStart({ lateStart }: ReportFigures): TakeSummary | null {
  if (!lateStart) return null;
  const { overheadLateMs } = lateStart;
  const strong = `Overhead file ${wholeMsText(overheadLateMs)} ${overheadLateMs > 0 ? 'late' : 'early'}.`;
  return { status: 'fix', strong, rest: 'Line the files up.' };
}

function droppedOut(figures: ReportFigures): TakeSummary | null {
  const role = ROLES.find((each) => (figures[each].dropouts?.count ?? 0) > 0);
  if (!role) return null;
  const { count } = figures[role].dropouts ?? { count: 0 };
  const rest = `Listen at ${count === 1 ? 'that place' : `${countText(count)} places`}.`;
  return { status: 'watch', strong: `${capitalised(role)} seems to drop out.`, rest };
}

function squashed(figures: ReportFigures): TakeSummary | null {
  const role = ROLES.find((each) => figures[each].looksFlattened);
  if (!role) return null;
  return { status: 'watch', strong: `${capitalised(role)} looks squashed.`, rest: 'Switch off any limiter.' };
}

function flip(figures: ReportFigures): TakeSummary | null {
  if (addingUpStatus(figures.agreement) !== 'fix') return null;
  return { status: 'fix', strong: 'Flip the overhead.', rest: gainRest(figures) };
}

function gainRest(figures: ReportFigures): string {
  const role = ROLES.find((each) => levelStatus(figures[each]) === 'watch');
  if (role) return turn(role, figures[role]);
  return noise(figures) ? 'Look for the noise.' : 'Levels are right.';
}

function turn(what: string, track: TrackReport): string {
  return `Turn the ${what} ${(track.gainChangeDb ?? 0) < 0 ? 'down' : 'up'} ${halfDbText(track.gainChangeDb ?? 0)} dB.`;
}

function gain(figures: ReportFigures): TakeSummary | null {
  const role = ROLES.find((each) => levelStatus(figures[each]) === 'watch');
  if (!role) return null;
  const level = figures[role].level === 'hot' ? 'hot' : 'low';
  return { status: 'watch', strong: `${capitalised(role)} is ${level}.`, rest: turnIt(figures[role]) };
}

function turnIt(track: TrackReport): string {
  return turn('preamp', track).replace('the preamp', 'it');
}

function noise(figures: ReportFigures): TakeSummary | null {
  const hum = loudHum(figures);
  if (hum) {
    const strong = `${capitalised(hum.role)} hums: ${wholeDbfsText(hum.levelDbfs)} dBFS.`;
    return { status: 'watch', strong, rest: 'Try another cable.' };
  }
  const noisier = noisierMicrophone(figures);
  if (!noisier || noisier.noiseDbfs <= NOISE_WATCH_DBFS) return null;
  const level = wholeDbfsText(noisier.noiseDbfs);
  return { status: 'watch', strong: `Noisy ${noisier.role}:`, rest: `${level} dBFS. Look for the source.` };
}

function unsure({ agreement }: ReportFigures): TakeSummary | null {
  const status = addingUpStatus(agreement);
  if (status === 'cannot-tell') {
    return { status, strong: 'Can’t tell if they add up.', rest: 'Play eight hard kicks.' };
  }
  return status === 'watch' ? { status, strong: 'Polarity unsure.', rest: 'Compare by ear.' } : null;
}

function good({ agreement }: ReportFigures): TakeSummary {
  const rest =
    agreement.verdict === 'either-way'
      ? 'Levels are right. Polarity: either way.'
      : 'Good take. Keep everything where it is.';
  return { status: 'good', strong: '', rest };
}
