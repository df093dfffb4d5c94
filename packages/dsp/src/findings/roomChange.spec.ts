import { compareTakes } from '../measurements/comparing/compareTakes';
import { takeFacts, type MadeTake } from '../testing/takeFacts';
import { roomChange } from './roomChange';

const told = (before: MadeTake, after: MadeTake, gainKnownSame = true) =>
  roomChange(
    compareTakes({
      before: takeFacts({ seed: 1, ...before }),
      after: takeFacts({ seed: 2, ...after }),
      gainKnownSame,
    }),
  );

describe('what a change to a room did', () => {
  it('says how much sooner a snare dies, once, and how many hits stand behind it', () => {
    const { status, strong, rest, figures } = told({ decayS: 0.6 }, { decayS: 0.5 });
    expect(status).toBe('good');
    expect(strong).toMatch(/^A snare dies 0\.(09|10|11) s sooner at (500 Hz|[124] kHz)\.$/);
    expect(rest).toBe('Sure: 12 hits before, 12 after.');
    expect(figures.filter(({ clear }) => clear).map(({ word }) => word)).toEqual(
      expect.arrayContaining(['shorter']) as unknown,
    );
    expect(figures.findIndex(({ clear }) => !clear)).not.toBe(0);
  });

  it('says later where it rings on', () => {
    expect(told({ decayS: 0.4 }, { decayS: 0.5 }).strong).toContain('s later at');
  });

  it('warns of noise that rose and says when it fell', () => {
    expect(told({ noiseDbfs: -61 }, { noiseDbfs: -52 })).toMatchObject({
      status: 'watch',
      strong: 'The overhead’s noise floor rose 9 dB, to −52 dBFS.',
      rest: 'Switch it off while you record.',
    });
    expect(told({ noiseDbfs: -52 }, { noiseDbfs: -61 })).toMatchObject({
      status: 'good',
      strong: 'The overhead’s noise floor fell 9 dB, to −61 dBFS.',
    });
  });

  it('says what the overhead hears of the low end where hits could be matched', () => {
    const less = told({ overhead63Dbfs: -40 }, { overhead63Dbfs: -44 });
    expect(less.strong).toMatch(/^The overhead hears [345] dB less at (63|125) Hz\.$/);
    expect(told({ overhead63Dbfs: -40 }, { overhead63Dbfs: -44 }, false).strong).toBe('No clear change');
  });

  it('joins two kinds of change into one sentence', () => {
    const { strong } = told({ decayS: 0.6, noiseDbfs: -52 }, { decayS: 0.4, noiseDbfs: -61 });
    expect(strong).toMatch(/^.+, and .+\.$/);
    expect(strong).toContain('sooner');
    expect(strong).toContain('noise floor fell');
  });

  it('says that nothing clear changed where the same was recorded again', () => {
    const take = takeFacts();
    const same = roomChange(compareTakes({ before: take, after: take, gainKnownSame: true }));
    expect(same).toMatchObject({
      status: 'cannot-tell',
      strong: 'No clear change',
      rest: 'in decay, low end or noise.',
    });
    expect(same.figures.length).toBeGreaterThan(0);
  });

  it('can’t tell where no take holds enough, and says what to play', () => {
    const few = { kicks: 2, drums: 2, noiseDbfs: null };
    expect(told(few, few)).toMatchObject({ status: 'cannot-tell', strong: 'Can’t tell:', figures: [] });
    expect(told(few, few).rest).toContain('play six');
  });
});
