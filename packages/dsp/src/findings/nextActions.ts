import { levelStatus, NOISE_WATCH_DBFS } from '../report/level';
import type { ActionId, NextAction, Reader, ReportFigures } from '../report/reportTypes';
import { addingUpStatus, hasFewHits } from './addingUpFinding';
import { loudHum } from './humFindings';
import { noisierMicrophone } from './noiseFinding';
import { halfDbText, wholeDbfsText } from './words';

const ROLES = ['kick', 'overhead'] as const;
type Role = (typeof ROLES)[number];

/**
 * The tick boxes under "before the next take": what to do in order of what matters, then what to leave alone.
 * @example
 * nextActions(figures, reader).map(({ id }) => id) // ['flip-overhead', 'leave-silence', 'kick-gain-leave', 'overhead-gain-leave']
 */
export function nextActions(figures: ReportFigures, reader: Reader): NextAction[] {
  const gains = (clipped: boolean): NextAction[] =>
    ROLES.filter((role) => (figures[role].level === 'clipped') === clipped).flatMap((role) =>
      gainActions(figures, role, reader),
    );
  const polarity = polarityActions(figures);
  const actions = [
    ...startActions(figures),
    ...gains(true),
    ...polarity.filter((action) => action.id === 'flip-overhead'),
    ...gains(false),
    ...noiseActions(figures),
    ...polarity.filter((action) => action.id !== 'flip-overhead'),
  ];
  return [...actions.filter((action) => !action.leave), ...actions.filter((action) => action.leave)];
}

function startActions({ lateStart }: ReportFigures): NextAction[] {
  if (!lateStart) return [];
  return [
    {
      id: 'export-together',
      action: 'Record both microphones in one go, and export both from the same start.',
      detail: 'Then the sheet can tell how they add.',
      leave: false,
    },
  ];
}

function gainActions(figures: ReportFigures, role: Role, { target }: Reader): NextAction[] {
  const track = figures[role];
  const change = halfDbText(track.gainChangeDb ?? 0);
  const shows = `Your hardest hit should show about ${wholeDbfsText(target.aimDbfs)}.`;
  const turn = (id: ActionId, action: string, detail: string): NextAction[] => [
    { id, action, detail, leave: false },
  ];
  if (track.level === null) return [];
  if (track.level === 'clipped') {
    return turn(
      `${role}-gain`,
      `Turn the ${role} preamp down at least ${change} dB.`,
      'Then play the hardest hits again.',
    );
  }
  if (track.level === 'hot') return turn(`${role}-gain`, `Turn the ${role} preamp down ${change} dB.`, shows);
  if (levelStatus(track) === 'watch') {
    return turn(
      `${role}-gain`,
      `Turn the ${role} preamp up ${change} dB.`,
      `Lower the headphones first. ${shows}`,
    );
  }
  return [
    { id: `${role}-gain-leave`, action: `Leave the ${role} preamp where it is.`, detail: '', leave: true },
  ];
}

function polarityActions({ agreement }: ReportFigures): NextAction[] {
  const status = addingUpStatus(agreement);
  if (agreement.reason === 'late-start') return [];
  if (status === 'fix') {
    return [
      {
        id: 'flip-overhead',
        action: 'Press the polarity switch',
        detail:
          'on the overhead preamp, or flip it on this sheet: no retake needed. Mute the monitors first.',
        leave: false,
      },
    ];
  }
  if (status === 'good' && agreement.verdict === 'keep') {
    return [{ id: 'polarity-leave', action: 'Leave the polarity switches alone.', detail: '', leave: true }];
  }
  if (status === 'good') return [];
  if (status === 'watch' && !hasFewHits(agreement)) {
    return [
      {
        id: 'compare-polarities',
        action: 'Compare both polarities by ear.',
        detail: 'The low end differs little, so either will do.',
        leave: false,
      },
    ];
  }
  return [
    {
      id: 'record-kicks',
      action: 'Record eight hard kicks with nothing else.',
      detail: 'Then the sheet can tell which polarity adds.',
      leave: false,
    },
  ];
}

function noiseActions(figures: ReportFigures): NextAction[] {
  if (loudHum(figures)) {
    return [
      {
        id: 'look-for-noise',
        action: 'Look for the hum: try another cable or outlet.',
        detail: 'Keep the safety earth. Then leave three seconds silent, to see what it did.',
        leave: false,
      },
    ];
  }
  const noisier = noisierMicrophone(figures);
  if (noisier && noisier.noiseDbfs <= NOISE_WATCH_DBFS) return [];
  return [
    noisier
      ? {
          id: 'look-for-noise',
          action: 'Switch off fans and heaters.',
          detail: 'Then leave three seconds silent, to see what it did.',
          leave: false,
        }
      : {
          id: 'leave-silence',
          action: 'Leave three seconds silent before playing.',
          detail: 'Then the noise can be measured.',
          leave: false,
        },
  ];
}
