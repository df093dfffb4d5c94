import { capitalised, decimalText, halfDbText, wholeDbfsText } from '../../findings/words';
import { levelStatus } from '../level';
import { said, type OutcomeRule, type OutcomeSaid } from './outcomeRule';
import type { TrackReport } from '../reportTypes';

type Role = 'kick' | 'overhead';

/** A change of peaks worth mentioning between two takes (docs/measurements.md, 8). */
const PEAK_STEP_DB = 1;

/**
 * What a turned preamp did, by the hardest hit of both takes. Somebody may simply have hit softer, so the sentence says
 * what the hits show, not what the preamp did.
 */
export const gainOutcome: OutcomeRule = ({ before, after, reader }, actionId) => {
  const role: Role = actionId === 'kick-gain' ? 'kick' : 'overhead';
  const [from, to] = [before[role], after[role]];
  if (to.level === null || to.loudestHitDbfs === null) return noHit(role);
  if (to.level === 'clipped') return stillClipped(role, to, from.level === 'clipped');
  const shows = `its hardest hit shows ${decimalText(to.loudestHitDbfs)}`;
  const strong = `The ${role} ${change(from, to)}:`;
  if (levelStatus(to) === 'good') {
    return said('good', strong, `${shows}; we aimed at ${wholeDbfsText(reader.target.aimDbfs)}.`);
  }
  const way = to.level === 'hot' ? 'down' : 'up';
  return said(
    'watch',
    strong,
    `${shows}; turn its preamp ${way} ${halfDbText(to.gainChangeDb ?? 0)} dB more.`,
  );
};

function change(from: TrackReport, to: TrackReport): string {
  if (from.level === 'clipped') return 'no longer clips';
  if (from.loudestHitDbfs === null || to.loudestHitDbfs === null) return 'is heard now';
  const changeDb = to.loudestHitDbfs - from.loudestHitDbfs;
  if (Math.abs(changeDb) < PEAK_STEP_DB) return 'is as loud as before';
  return `is ${halfDbText(changeDb)} dB ${changeDb < 0 ? 'quieter' : 'louder'}`;
}

function stillClipped(role: Role, track: TrackReport, before: boolean): OutcomeSaid {
  return said(
    'fix',
    before ? `The ${role} still clips:` : `The ${role} clips now:`,
    `turn its preamp down at least ${halfDbText(track.gainChangeDb ?? 0)} dB.`,
  );
}

function noHit(role: Role): OutcomeSaid {
  return said('cannot-tell', `Can’t tell how loud the ${role} is now:`, 'no hit was found in this take.');
}

/** Whether a preamp that was to be left alone still fits; a change of more than this is told. Our choice: a hard day's playing. */
const STRENGTH_DB = 3;

/** What a preamp that was left alone shows in the next take. */
export const leftGainOutcome: OutcomeRule = ({ before, after }, actionId) => {
  const role: Role = actionId === 'kick-gain-leave' ? 'kick' : 'overhead';
  const [from, to] = [before[role], after[role]];
  if (to.level === null || to.loudestHitDbfs === null) return noHit(role);
  if (to.level === 'clipped') return stillClipped(role, to, false);
  const shows = `its hardest hit shows ${decimalText(to.loudestHitDbfs)}`;
  const changeDb = to.loudestHitDbfs - (from.loudestHitDbfs ?? to.loudestHitDbfs);
  if (levelStatus(to) === 'good') {
    return Math.abs(changeDb) <= STRENGTH_DB
      ? said('good', `The ${role} still fits:`, `${shows}.`)
      : said(
          'good',
          `The ${role} moved, and fits:`,
          `${shows} and was ${decimalText(from.loudestHitDbfs ?? 0)}.`,
        );
  }
  return said(
    'watch',
    `${capitalised(role)} ${to.level === 'hot' ? 'hot' : 'low'} now:`,
    `${shows} and was ${decimalText(from.loudestHitDbfs ?? 0)}; other hits, or the preamp moved.`,
  );
};
