import type { ComparedFigure, ComparedKey } from '../../measurements/comparing/comparedFigure';
import { agreementFigures, reportOf } from '../../testing/figures';
import type { Outcome } from '../reportTypes';
import { comparedPolarity, type ComparedPolarity } from './comparedPolarity';
import { comparisonCaveats } from './comparisonCaveats';
import { comparisonLine, type ComparisonLineOptions } from './comparisonLine';
import { doneWords } from './doneWords';

const choice = (name: 'as-recorded' | 'flipped', lowEndDb: number) => ({
  name,
  flipped: name === 'flipped',
  shiftMs: 0,
  lowEndDb,
  deepest: null,
});
const takeOf = (recordedDb: number, flippedDb: number) =>
  reportOf({
    agreement: agreementFigures({
      choices: [choice('as-recorded', recordedDb), choice('flipped', flippedDb)],
    }),
  });
const opposite = takeOf(-0.7, 0.7);
const together = takeOf(0.6, -0.8);

type Seen = 'flipped' | 'as-before' | null;
const soundOf = (seen: Seen, turnedHits = seen === 'flipped' ? 8 : 0) => ({
  likeness: seen && (seen === 'flipped' ? -0.9 : 0.9),
  seen,
  hits: 8,
  turnedHits,
});
const between = (seen: Seen, notedFlip: boolean, [before, after] = [opposite, together]) =>
  comparedPolarity({ before, after, sound: soundOf(seen), notedFlip });

describe('polarity from one take to another', () => {
  it('confirms a flip that was noted, with what was expected and what was reached', () => {
    expect(between('flipped', true)).toEqual({
      noted: true,
      seen: 'flipped',
      confirmed: true,
      sentence:
        'You noted a flip, and the sound confirms it: the low end turned over in 8 of 8 hits. It was to reach 0.7 dB and reached 0.6.',
      beforeDb: -0.7,
      afterDb: 0.6,
      expectedDb: 0.7,
    });
  });

  it('leaves the number of hits out where few show alone what all say together', () => {
    const told = comparedPolarity({
      before: opposite,
      after: together,
      sound: soundOf('flipped', 3),
      notedFlip: true,
    });
    expect(told.sentence).toMatch(/the low end turned over\. It was/);
  });

  it('tells a flip that nobody noted', () => {
    const { confirmed, sentence } = between('flipped', false);
    expect(confirmed).toBe(false);
    expect(sentence).toMatch(
      /^The sound says the overhead was flipped between these takes, though nothing says so/,
    );
  });

  it('contradicts a flip that was noted where nothing turned over', () => {
    const told = between('as-before', true, [opposite, opposite]);
    expect(told).toMatchObject({ seen: 'as-before', confirmed: false, expectedDb: null });
    expect(told.sentence).toMatch(/^You noted a flip, but the sound says nothing turned over/);
  });

  it('says nothing where nothing was noted and nothing turned over', () => {
    expect(between('as-before', false)).toMatchObject({ seen: 'as-before', confirmed: true, sentence: '' });
  });

  it('can’t tell without kick hits, and says why', () => {
    const silent = reportOf({ agreement: agreementFigures({ hitsUsed: 0, choices: [] }) });
    const told = between(null, true, [silent, together]);
    expect(told).toMatchObject({ seen: 'cannot-tell', confirmed: null, beforeDb: null, afterDb: 0.6 });
    expect(told.sentence).toMatch(/one of the takes holds no kick hit\.$/);
  });
});

const asBefore = between('as-before', false, [together, together]);
const flipped = between('flipped', true);
const figure = (key: ComparedKey, change: Partial<ComparedFigure> = {}): ComparedFigure => ({
  key,
  unit: 'dB',
  before: 0,
  after: 0,
  change: 0,
  interval95: null,
  step: { kind: 'difference', size: 0.5 },
  clear: false,
  reason: null,
  hitsBefore: 8,
  hitsAfter: 8,
  word: null,
  ...change,
});
const line = (options: Partial<ComparisonLineOptions> = {}) =>
  comparisonLine({
    isSameTake: false,
    outcomes: [],
    polarity: asBefore,
    figures: [figure('attack')],
    ...options,
  })
    .map(({ action, reason }) => `${action} ${reason}`)
    .join(' ');
const outcome = (actionId: Outcome['actionId'], strong: string, rest: string): Outcome => ({
  actionId,
  status: 'good',
  strong,
  rest,
});

describe('the line of a comparison', () => {
  it('opens with what became of what was done', () => {
    const outcomes = [
      outcome('flip-overhead', 'The flip worked:', '1.3 dB of low end came back; we expected 1.4.'),
      outcome('kick-gain', 'The kick is 6 dB quieter:', 'its hardest hit shows −8.9; we aimed at −9.'),
    ];
    expect(line({ outcomes, polarity: flipped })).toBe(
      'The flip worked: 1.3 dB of low end came back; we expected 1.4. Leave the kick preamp there.',
    );
  });

  it('tells a flip that was not noted, whichever way it went', () => {
    expect(line({ polarity: between('flipped', false) })).toBe(
      'The overhead was flipped: 1.3 dB of low end came back.',
    );
    expect(line({ polarity: between('flipped', false, [together, opposite]) })).toBe(
      'The overhead was flipped: 1.3 dB of low end was lost.',
    );
  });

  it('tells the largest clear changes by their steps', () => {
    const figures = [
      figure('attack', {
        before: -20,
        after: -18.5,
        change: 1.5,
        clear: true,
        word: 'brighter',
        step: { kind: 'difference', size: 1 },
      }),
      figure('decay-500', {
        unit: 's',
        before: 0.5,
        after: 0.3,
        change: -0.4,
        clear: true,
        word: 'shorter',
        step: { kind: 'share', size: 0.1 },
      }),
      figure('evenness', { before: 2, after: 2.4, change: 0.4 }),
    ];
    expect(line({ figures })).toBe('Decay, 500 Hz: shorter, by 0.20 s. Attack: brighter, by 1.5 dB.');
  });

  it('says that nothing changed, and that a take compared with itself can’t have', () => {
    expect(line()).toBe('No clear change: nothing moved by more than it varies from hit to hit.');
    expect(line({ isSameTake: true })).toBe('The same take twice: no clear change, as it should be.');
  });

  it('says what would settle it where nothing can be told', () => {
    const figures = [figure('attack', { change: null, reason: 'too-few-hits' })];
    expect(line({ figures })).toMatch(/^Can’t tell what changed: .*record six of each kind in both\.$/);
  });
});

describe('cautions about a comparison', () => {
  const unmatched = figure('attack', { change: null, reason: 'strength-unmatched' });
  const caveats = (
    figures: ComparedFigure[],
    gain: 'same' | 'changed' | 'unknown',
    polarity: ComparedPolarity = asBefore,
  ) => comparisonCaveats({ figures, polarity, gain });

  it('say why hits can’t be matched, and what would settle it', () => {
    expect(caveats([unmatched], 'changed')).toEqual([
      {
        about: 'matching',
        text: 'A preamp changed, so hits can’t be matched by strength. Attack is left out: record one more take without touching the preamps.',
      },
    ]);
    expect(caveats([unmatched], 'unknown')[0].text).toMatch(/note their gain in the setups of both takes\.$/);
  });

  it('count what is left out for want of hits', () => {
    const few = (['decay-500', 'decay-1000', 'brightness'] as const).map((key) =>
      figure(key, { change: null, reason: 'too-few-hits' }),
    );
    expect(caveats(few, 'same')[0].text).toMatch(/^Decay, 500 Hz and 2 others are left out/);
  });

  it('point at the switch where a noted flip is contradicted', () => {
    expect(caveats([], 'same', between('as-before', true)).map(({ about }) => about)).toEqual(['the flip']);
  });

  it('are none where everything could be told', () => {
    expect(caveats([figure('attack')], 'same')).toEqual([]);
  });
});

describe('what was done between two takes', () => {
  it('is told apart from what was left alone; unknown ids are left out', () => {
    expect(doneWords(['kick-gain-leave', 'flip-overhead', 'made-later'])).toEqual({
      done: ['overhead polarity switched'],
      leftAlone: ['kick preamp'],
    });
  });
});
