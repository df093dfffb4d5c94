import { levelStatus, NOISE_WATCH_DBFS } from '../report/level';
import type { LineSentence, Outcome, Reader, ReportFigures } from '../report/reportTypes';
import { addingUpStatus, hasFewHits } from './addingUpFinding';
import { clippedHits } from './clippedHits';
import { loudHum } from './humFindings';
import { noisierMicrophone } from './noiseFinding';
import { counted, countText, decimalText, halfDbText, wholeDbfsText, wholeMsText } from './words';

const ROLES = ['kick', 'overhead'] as const;
const SENTENCES = 2;

/**
 * The one or two sentences a sheet opens with: what to do, most important first, or that the take is good.
 *
 * Order: clipped, silent or without hits, flip, hot, low, noise, what can't be told. A take that follows another opens with
 * what became of that one's most important action, where it turned out well: "The flip worked: 1.3 dB of low end came back."
 *
 * @param outcomes - of `outcomes(…)`, most important first
 * @example
 * reportLine(figures, reader)[0].action // 'Flip the overhead:'
 */
export function reportLine(
  figures: ReportFigures,
  _reader: Reader,
  outcomes: readonly Outcome[] = [],
): LineSentence[] {
  const opening = openingOf(outcomes);
  const sentences = [
    ...opening,
    ...clipped(figures),
    ...missing(figures),
    ...lateStart(figures),
    ...dropouts(figures),
    ...flip(figures),
    ...hot(figures),
    ...low(figures),
    ...squashed(figures),
    ...noise(figures),
    ...unsure(figures),
  ].slice(0, SENTENCES);
  if (sentences.length > opening.length) return sentences;
  return opening.length > 0 ? [...opening, LEVELS_FIT] : [goodTake(figures)];
}

/** After good news a good take needs no more than this; its levels fit, or something would have been said of them. */
const LEVELS_FIT: LineSentence = { action: 'Levels fit.', reason: '' };

/** The first clause is the news; what was expected stands beside the outcome itself. */
function openingOf([first]: readonly Outcome[]): LineSentence[] {
  // That something left alone still fits is no news.
  if (first?.status !== 'good' || first.actionId.endsWith('-leave')) return [];
  return [{ action: first.strong, reason: `${first.rest.split(';')[0].replace(/\.$/, '')}.` }];
}

function clipped(figures: ReportFigures): LineSentence[] {
  return ROLES.filter((role) => figures[role].level === 'clipped').map((role) => {
    const hits = clippedHits(figures, figures[role]);
    const what = hits > 0 ? `${countText(hits)} hit${hits === 1 ? ' is' : 's are'}` : 'its peaks are';
    return {
      action: `Turn the ${role} down at least ${halfDbText(figures[role].gainChangeDb ?? 0)} dB:`,
      reason: `${what} flattened, and that can’t be repaired.`,
    };
  });
}

function missing(figures: ReportFigures): LineSentence[] {
  const silent = ROLES.filter((role) => figures[role].samplePeakDbfs === null);
  if (silent.length > 0) {
    return silent.map((role) => ({ action: `Check the ${role} microphone:`, reason: 'its file is silent.' }));
  }
  return figures.agreement.reason === 'no-kick-hits'
    ? [{ action: 'Record eight hard kicks:', reason: 'no kick hit was found in this take.' }]
    : [];
}

function lateStart({ lateStart }: ReportFigures): LineSentence[] {
  if (!lateStart) return [];
  const { overheadLateMs } = lateStart;
  const [play, because] = overheadLateMs > 0 ? ['earlier', 'late'] : ['later', 'early'];
  const by = wholeMsText(overheadLateMs);
  return [{ action: `Play the overhead ${by} ${play}:`, reason: `its file runs that much ${because}.` }];
}

function dropouts(figures: ReportFigures): LineSentence[] {
  return ROLES.filter((role) => (figures[role].dropouts?.count ?? 0) > 0).map((role) => ({
    action: 'Raise the buffer size:',
    reason: `the ${role} seems to drop out in ${counted(figures[role].dropouts?.count ?? 0, 'place')}.`,
  }));
}

function squashed(figures: ReportFigures): LineSentence[] {
  return ROLES.filter((role) => figures[role].looksFlattened && figures[role].level !== 'clipped').map(
    (role) => ({
      action: 'Switch off any limiter:',
      reason: `the loudest ${role} peaks look squashed.`,
    }),
  );
}

function flip({ agreement }: ReportFigures): LineSentence[] {
  if (addingUpStatus(agreement) !== 'fix') return [];
  const gain = decimalText(agreement.flipGainMatchedDb ?? 0);
  return [{ action: 'Flip the overhead:', reason: `the kick gets ${gain} dB of its low end back.` }];
}

function hot(figures: ReportFigures): LineSentence[] {
  return ROLES.filter((role) => figures[role].level === 'hot').map((role) => ({
    action: `Turn the ${role} down:`,
    reason: 'a harder hit would clip.',
  }));
}

function low(figures: ReportFigures): LineSentence[] {
  return ROLES.filter((role) => figures[role].level === 'low' && levelStatus(figures[role]) === 'watch').map(
    (role) => ({
      action: `Turn the ${role} up:`,
      reason: 'raising it later would raise the noise as well.',
    }),
  );
}

function noise(figures: ReportFigures): LineSentence[] {
  const hum = loudHum(figures);
  if (hum) {
    const reason = `the mains sit at ${wholeDbfsText(hum.levelDbfs)} dBFS in the ${hum.role}.`;
    return [{ action: 'Look for the hum:', reason }];
  }
  const noisier = noisierMicrophone(figures);
  if (!noisier || noisier.noiseDbfs <= NOISE_WATCH_DBFS) return [];
  const level = wholeDbfsText(noisier.noiseDbfs);
  return [
    { action: 'Look for the noise:', reason: `the ${noisier.role} never gets quieter than ${level} dBFS.` },
  ];
}

function unsure(figures: ReportFigures): LineSentence[] {
  const { agreement } = figures;
  const status = addingUpStatus(agreement);
  if (
    figures.lateStart ||
    agreement.reason === 'no-kick-hits' ||
    ROLES.some((role) => figures[role].samplePeakDbfs === null)
  )
    return [];
  if (status === 'cannot-tell') {
    return [{ action: 'Record eight hard kicks:', reason: 'this take can’t tell which polarity adds.' }];
  }
  if (status !== 'watch') return [];
  return hasFewHits(agreement)
    ? [
        {
          action: 'Record eight hard kicks:',
          reason: `${counted(agreement.hitsUsed, 'kick hit')} can’t settle the polarity.`,
        },
      ]
    : [{ action: 'Compare both polarities by ear:', reason: 'the low end leans too little to be sure.' }];
}

function goodTake({ agreement }: ReportFigures): LineSentence {
  return agreement.verdict === 'either-way'
    ? { action: 'Good take.', reason: 'Levels are right, and the polarity is either way.' }
    : { action: 'Good take.', reason: 'Keep everything where it is.' };
}
