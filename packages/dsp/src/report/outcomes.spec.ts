import { nextActions } from '../findings/nextActions';
import { reportLine } from '../findings/reportLine';
import { delayedPair } from '../testing/delayedPair';
import {
  agreementFigures,
  clippedTrack,
  flipFigures,
  hotTrack,
  lateFigures,
  lowTrack,
  reportOf,
  silentTrack,
  trackFigures,
} from '../testing/figures';
import { outcomes } from './outcomes';
import {
  actionIds,
  defaultTarget,
  type ActionId,
  type AgreementReport,
  type ReportFigures,
} from './reportTypes';

const reader = { lengthUnit: 'metre', target: defaultTarget } as const;

/** As recorded, the low end stands at `lowEndDb`. */
const standing = (lowEndDb: number, agreement: AgreementReport): AgreementReport => ({
  ...agreement,
  choices: [{ name: 'as-recorded', flipped: false, shiftMs: 0, lowEndDb, deepest: null }],
});
const cancels = reportOf({ agreement: standing(-0.7, flipFigures) });
const adds = reportOf({ agreement: standing(0.6, agreementFigures({ flipGainMatchedDb: -1.3 })) });
const unsureAdds = reportOf({ agreement: standing(0.6, agreementFigures({ sure: false, hitsUsed: 2 })) });
const disagree = reportOf({
  agreement: agreementFigures({
    verdict: 'cannot-tell',
    sure: false,
    reason: 'hits-disagree',
    agreeingHits: 4,
  }),
});
const noKicks = reportOf({
  hits: [],
  kick: trackFigures({ loudestHitDbfs: null }),
  agreement: agreementFigures({ verdict: 'cannot-tell', sure: false, reason: 'no-kick-hits', hitsUsed: 0 }),
});
const eitherWay = reportOf({
  agreement: standing(0.1, agreementFigures({ verdict: 'either-way', flipGainMatchedDb: 0.2 })),
});
const small = reportOf({ agreement: agreementFigures({ sure: false, flipGainMatchedDb: -0.6 }) });
const kick = (change: Parameters<typeof trackFigures>[0]): ReportFigures =>
  reportOf({ kick: trackFigures(change) });
const noise = (noiseFloorDbfs: number | null): ReportFigures =>
  reportOf({ overhead: trackFigures({ noiseFloorDbfs }) });
const noSilence = reportOf({
  kick: trackFigures({ noiseFloorDbfs: null, noiseFloorReason: 'no-quiet-second' }),
  overhead: trackFigures({ noiseFloorDbfs: null, noiseFloorReason: 'no-quiet-second' }),
});

const asBefore = { before: delayedPair({ delayMs: 1 }), after: delayedPair({ delayMs: 1.2, gain: 0.5 }) };
const flipped = { before: delayedPair({ delayMs: 1 }), after: delayedPair({ delayMs: 1.2, gain: -0.5 }) };

type Case = readonly [
  id: ActionId,
  what: string,
  before: ReportFigures,
  after: ReportFigures,
  expected: string,
  spectra?: typeof asBefore,
];

const good = reportOf();
const cases: readonly Case[] = [
  [
    'flip-overhead',
    'gains',
    cancels,
    adds,
    'good The flip worked: 1.3 dB of low end came back; we expected 1.4.',
  ],
  [
    'flip-overhead',
    'is seen',
    cancels,
    adds,
    'good The flip worked: 1.3 dB of low end came back; we expected 1.4.',
    flipped,
  ],
  [
    'flip-overhead',
    'gains, with two hits',
    cancels,
    unsureAdds,
    'watch The flip helped, not for sure: 1.3 dB of low end came back; we expected 1.4.',
  ],
  [
    'flip-overhead',
    'still cancels',
    cancels,
    cancels,
    'watch The flip isn’t in this take: the low end still cancels; flip it on this sheet, or press the switch.',
  ],
  [
    'flip-overhead',
    'is seen to be missing',
    cancels,
    cancels,
    'watch The flip isn’t in this take: the polarity is as before; flip it on this sheet, or press the switch.',
    asBefore,
  ],
  [
    'flip-overhead',
    'is missing, though low end came back',
    cancels,
    adds,
    'watch The flip isn’t in this take: 1.3 dB of low end came back all the same, so something else moved.',
    asBefore,
  ],
  [
    'flip-overhead',
    'is seen, and gains nothing',
    cancels,
    cancels,
    'watch The overhead is flipped: the low end hardly gained (0.0 dB); we expected 1.4.',
    flipped,
  ],
  [
    'flip-overhead',
    'changes nothing',
    adds,
    eitherWay,
    'cannot-tell Can’t tell whether the flip worked: the low end hardly changed; was the overhead moved too?',
  ],
  [
    'flip-overhead',
    'with hits that disagree',
    cancels,
    disagree,
    'cannot-tell Can’t tell whether the flip worked: only 4 of 8 kick hits agree; record eight hard kicks.',
  ],
  [
    'flip-overhead',
    'without kicks',
    cancels,
    noKicks,
    'cannot-tell Can’t tell whether the flip worked: this take holds no kick hit; record eight hard kicks.',
  ],
  [
    'kick-gain',
    'on target',
    reportOf({ kick: hotTrack }),
    kick({ loudestHitDbfs: -9.1 }),
    'good The kick is 6.5 dB quieter: its hardest hit shows −9.1; we aimed at −9.',
  ],
  [
    'kick-gain',
    'not far enough',
    reportOf({ kick: hotTrack }),
    kick({ loudestHitDbfs: -4.6 }),
    'watch The kick is 2 dB quieter: its hardest hit shows −4.6; turn its preamp down 4.5 dB more.',
  ],
  [
    'kick-gain',
    'not turned',
    reportOf({ kick: hotTrack }),
    kick({ loudestHitDbfs: -2.9 }),
    'watch The kick is as loud as before: its hardest hit shows −2.9; turn its preamp down 6 dB more.',
  ],
  [
    'kick-gain',
    'clipped no more',
    reportOf({ kick: clippedTrack }),
    good,
    'good The kick no longer clips: its hardest hit shows −8.4; we aimed at −9.',
  ],
  [
    'kick-gain',
    'still clipped',
    reportOf({ kick: clippedTrack }),
    reportOf({ kick: clippedTrack }),
    'fix The kick still clips: turn its preamp down at least 9 dB.',
  ],
  [
    'kick-gain',
    'without a hit',
    reportOf({ kick: hotTrack }),
    noKicks,
    'cannot-tell Can’t tell how loud the kick is now: no hit was found in this take.',
  ],
  [
    'overhead-gain',
    'up',
    reportOf({ overhead: lowTrack }),
    good,
    'good The overhead is 12.5 dB louder: its hardest hit shows −8.4; we aimed at −9.',
  ],
  [
    'overhead-gain',
    'up too far',
    reportOf({ overhead: lowTrack }),
    reportOf({ overhead: clippedTrack }),
    'fix The overhead clips now: turn its preamp down at least 9 dB.',
  ],
  [
    'overhead-gain',
    'silent before',
    reportOf({ overhead: silentTrack }),
    good,
    'good The overhead is heard now: its hardest hit shows −8.4; we aimed at −9.',
  ],
  [
    'kick-gain-leave',
    'fits',
    good,
    kick({ loudestHitDbfs: -7.2 }),
    'good The kick still fits: its hardest hit shows −7.2.',
  ],
  [
    'kick-gain-leave',
    'hot',
    good,
    reportOf({ kick: hotTrack }),
    'watch Kick hot now: its hardest hit shows −2.7 and was −8.4; other hits, or the preamp moved.',
  ],
  [
    'kick-gain-leave',
    'moved inside the target',
    good,
    kick({ loudestHitDbfs: -11.9 }),
    'good The kick moved, and fits: its hardest hit shows −11.9 and was −8.4.',
  ],
  [
    'overhead-gain-leave',
    'clipped',
    good,
    reportOf({ overhead: clippedTrack }),
    'fix The overhead clips now: turn its preamp down at least 9 dB.',
  ],
  [
    'overhead-gain-leave',
    'silent',
    good,
    reportOf({ overhead: silentTrack }),
    'cannot-tell Can’t tell how loud the overhead is now: no hit was found in this take.',
  ],
  [
    'polarity-leave',
    'adds',
    good,
    adds,
    'good The polarity still adds: flipping would cost 1.3 dB of low end.',
  ],
  [
    'polarity-leave',
    'either way',
    good,
    eitherWay,
    'good The polarity hardly matters now: a flip would change the low end by 0.2 dB.',
  ],
  [
    'polarity-leave',
    'cancels',
    good,
    cancels,
    'watch The microphones cancel now: flipping would return 1.4 dB; something moved.',
  ],
  [
    'polarity-leave',
    'switched',
    good,
    cancels,
    'watch The polarity was switched: flipping would return 1.4 dB.',
    flipped,
  ],
  [
    'polarity-leave',
    'disagrees',
    good,
    disagree,
    'cannot-tell Can’t tell the polarity in this take: its kick hits disagree; record eight hard ones.',
  ],
  [
    'record-kicks',
    'settles it',
    disagree,
    good,
    'good Eight kicks are there: they settle the polarity: keep it.',
  ],
  [
    'record-kicks',
    'settles a flip',
    disagree,
    cancels,
    'good Eight kicks are there: they settle the polarity: flip the overhead.',
  ],
  [
    'record-kicks',
    'still disagrees',
    disagree,
    disagree,
    'watch Eight kicks are there: only 4 of them agree; move the overhead slightly.',
  ],
  [
    'record-kicks',
    'leans too little',
    disagree,
    small,
    'watch Eight kicks are there: the low end leans too little to be sure; compare by ear.',
  ],
  [
    'record-kicks',
    'too few',
    disagree,
    unsureAdds,
    'watch Two kicks are there: eight would settle more; play them with nothing else.',
  ],
  [
    'record-kicks',
    'none',
    disagree,
    noKicks,
    'cannot-tell No kick was found: record eight hard ones with nothing else.',
  ],
  [
    'compare-polarities',
    'settled since',
    small,
    good,
    'good The sheet can tell now: flipping would cost 1.4 dB, so keep it.',
  ],
  [
    'compare-polarities',
    'to flip now',
    small,
    cancels,
    'watch The sheet can tell now: flipping would return 1.4 dB of low end.',
  ],
  [
    'compare-polarities',
    'by ear',
    small,
    small,
    'cannot-tell Your ear decides: the low end differs by 0.6 dB, too little to say which is better.',
  ],
  [
    'compare-polarities',
    'flipped by ear',
    small,
    small,
    'cannot-tell You flipped the overhead: the low end differs by 0.6 dB, too little to say which is better.',
    flipped,
  ],
  [
    'compare-polarities',
    'disagrees',
    small,
    disagree,
    'cannot-tell Can’t tell the polarity in this take: its kick hits disagree; record eight hard ones.',
  ],
  ['leave-silence', 'quiet', noSilence, good, 'good The silence is there: noise stays at −72 dBFS or lower.'],
  [
    'leave-silence',
    'noisy',
    noSilence,
    noise(-52),
    'watch The silence is there: it shows noise at −52 dBFS in the overhead.',
  ],
  [
    'leave-silence',
    'none',
    noSilence,
    noSilence,
    'cannot-tell No quiet second was found: leave three seconds silent before playing.',
  ],
  [
    'look-for-noise',
    'found',
    noise(-52),
    noise(-68),
    'good The noise is 16 dB lower: −68 dBFS in the overhead; it was −52.',
  ],
  [
    'look-for-noise',
    'half found',
    noise(-50),
    noise(-56),
    'watch The noise is 6 dB lower: −56 dBFS in the overhead; it was −50.',
  ],
  [
    'look-for-noise',
    'not found',
    noise(-52),
    noise(-51.5),
    'watch The noise is still there: −52 dBFS in the overhead; it was −52.',
  ],
  [
    'look-for-noise',
    'worse',
    noise(-52),
    noise(-45),
    'watch It got noisier: −45 dBFS in the overhead; it was −52.',
  ],
  [
    'look-for-noise',
    'no silence',
    noise(-52),
    noSilence,
    'cannot-tell No quiet second was found: leave three seconds silent before playing.',
  ],
  [
    'export-together',
    'together',
    reportOf(lateFigures),
    reportOf(),
    'good Both files start together: they were 320 ms apart.',
  ],
  [
    'export-together',
    'still apart',
    reportOf(lateFigures),
    reportOf({ ...lateFigures, lateStart: { overheadLateMs: -45.4, likeness: 0.7 } }),
    'fix The files still start apart: 45 ms; they were 320 ms apart.',
  ],
  [
    'export-together',
    'no kicks to see it by',
    reportOf(lateFigures),
    reportOf({ ...noKicks, arrival: { ...lateFigures.arrival, reason: 'no-kick-hits' } }),
    'cannot-tell Can’t tell if the files start together: record eight hard kicks.',
  ],
];

describe('what became of an action', () => {
  // A row each as one value: jest takes a parameter that a row doesn't fill for its callback.
  it.each(cases.map((row) => ({ title: `${row[0]}: ${row[1]}`, row })))('$title', ({ row }) => {
    const [id, , before, after, expected, spectra] = row;
    const [told] = outcomes({ before, after, doneActions: [id], reader, spectra });
    expect(`${told.status} ${told.strong} ${told.rest}`).toBe(expected);
    expect(`${told.strong} ${told.rest}`.split(/\s+/).length).toBeLessThanOrEqual(25);
  });

  it('is told for every action there is', () => {
    expect(new Set(cases.map(([id]) => id))).toEqual(new Set(actionIds));
  });

  it('can’t be told for the noise where the preamp was turned too', () => {
    const takes = { before: noise(-52), reader, doneActions: ['look-for-noise', 'overhead-gain'] };
    const noiseOf = (after: ReportFigures) => outcomes({ ...takes, after }).at(-1);
    expect(noiseOf(noise(-56))).toMatchObject({
      status: 'cannot-tell',
      strong: 'Can’t tell what the search did:',
    });
    expect(noiseOf(noise(-66))).toMatchObject({ status: 'good', strong: 'The noise is low enough:' });
  });

  it('is told in the order of what matters, and not for ids nobody knows', () => {
    const doneActions = ['polarity-leave', 'kick-gain', 'flip-overhead', 'dance'];
    const ids = (before: ReportFigures) =>
      outcomes({ before, after: adds, doneActions, reader }).map((outcome) => outcome.actionId);
    expect(ids(cancels)).toEqual(['flip-overhead', 'kick-gain', 'polarity-leave']);
    expect(ids({ ...cancels, kick: clippedTrack })).toEqual(['kick-gain', 'flip-overhead', 'polarity-leave']);
    expect(outcomes({ before: cancels, after: adds, doneActions: [], reader })).toEqual([]);
  });

  it('has a rule for whatever the take before asked for', () => {
    for (const before of [
      good,
      cancels,
      disagree,
      small,
      reportOf(lateFigures),
      noSilence,
      reportOf({ kick: lowTrack }),
    ]) {
      const doneActions = nextActions(before, reader).map((action) => action.id);
      expect(outcomes({ before, after: good, doneActions, reader })).toHaveLength(doneActions.length);
    }
  });
});

describe('the line of a take that follows', () => {
  const line = (after: ReportFigures, doneActions: string[], before = cancels) =>
    reportLine(after, reader, outcomes({ before, after, doneActions, reader }))
      .map(({ action, reason }) => `${action} ${reason}`.trim())
      .join(' ');

  it('opens with good news, and has nothing to add to a good take', () => {
    expect(line(adds, ['flip-overhead'])).toBe('The flip worked: 1.3 dB of low end came back. Levels fit.');
  });

  it('goes on with what is next', () => {
    expect(line({ ...adds, kick: hotTrack }, ['flip-overhead'])).toBe(
      'The flip worked: 1.3 dB of low end came back. Turn the kick down: a harder hit would clip.',
    );
  });

  it('is as without a take before where the news isn’t good, or nothing was to be done', () => {
    expect(line(cancels, ['flip-overhead'])).toMatch(/^Flip the overhead:/);
    expect(line(good, ['kick-gain-leave'], good)).toBe('Good take. Keep everything where it is.');
  });
});
