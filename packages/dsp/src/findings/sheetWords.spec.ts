import { defaultTarget } from '../report/reportTypes';
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
import { nextActions } from './nextActions';
import { reportLine } from './reportLine';
import { takeSummary } from './takeSummary';

const reader = { lengthUnit: 'metre', target: defaultTarget } as const;
const line = (figures = reportOf()) =>
  reportLine(figures, reader)
    .map(({ action, reason }) => `${action} ${reason}`)
    .join(' ');
const actions = (figures = reportOf()) => nextActions(figures, reader);
const noHits = reportOf({
  hits: [],
  kick: trackFigures({ loudestHitDbfs: null }),
  agreement: agreementFigures({ verdict: 'cannot-tell', sure: false, reason: 'no-kick-hits', hitsUsed: 0 }),
});
const oneHit = reportOf({ agreement: agreementFigures({ sure: false, hitsUsed: 1, agreeingHits: 1 }) });
const noisy = reportOf({ overhead: trackFigures({ noiseFloorDbfs: -52 }) });
const eitherWay = reportOf({
  agreement: agreementFigures({ verdict: 'either-way', flipGainMatchedDb: 0.1 }),
});
const small = reportOf({ agreement: agreementFigures({ sure: false, flipGainMatchedDb: -0.6 }) });

describe('the line', () => {
  it('says flip before hot, two sentences at most', () => {
    const figures = reportOf({ agreement: flipFigures, kick: hotTrack, overhead: hotTrack });
    expect(line(figures)).toBe(
      'Flip the overhead: the kick gets 1.4 dB of its low end back. Turn the kick down: a harder hit would clip.',
    );
  });

  it('says clipped before anything else', () => {
    expect(line(reportOf({ agreement: flipFigures, kick: clippedTrack }))).toMatch(
      /^Turn the kick down at least 9 dB: two hits are flattened, and that can’t be repaired\. Flip/,
    );
  });

  it('says by how much a file is to be moved', () => {
    expect(line(reportOf(lateFigures))).toBe(
      'Play the overhead 320 ms earlier: its file runs that much late.',
    );
  });

  it('leaves a good take alone', () => {
    expect(line()).toBe('Good take. Keep everything where it is.');
    expect(line(eitherWay)).toBe('Good take. Levels are right, and the polarity is either way.');
  });

  it('says low, noisy, silent, and what can’t be told', () => {
    expect(line(reportOf({ overhead: lowTrack }))).toMatch(/^Turn the overhead up:/);
    expect(line(noisy)).toContain('the overhead never gets quieter than −52 dBFS.');
    expect(line(noHits)).toBe('Record eight hard kicks: no kick hit was found in this take.');
    expect(line(oneHit)).toBe('Record eight hard kicks: one kick hit can’t settle the polarity.');
    expect(line(small)).toMatch(/^Compare both polarities by ear:/);
    expect(line(reportOf({ ...noHits, kick: silentTrack }))).toBe(
      'Check the kick microphone: its file is silent.',
    );
  });
});

describe('before the next take', () => {
  it('lists what to do in order of what matters, then what to leave', () => {
    const list = actions(reportOf({ agreement: flipFigures, kick: hotTrack }));
    expect(list.map((action) => [action.id, action.leave])).toEqual([
      ['flip-overhead', false],
      ['kick-gain', false],
      ['overhead-gain-leave', true],
    ]);
    expect(list[1]).toMatchObject({
      action: 'Turn the kick preamp down 6.5 dB.',
      detail: 'Your hardest hit should show about −9.',
    });
  });

  it('turns a clipped preamp before it flips anything', () => {
    const [first, second] = actions(reportOf({ agreement: flipFigures, overhead: clippedTrack }));
    expect([first.id, first.action]).toEqual([
      'overhead-gain',
      'Turn the overhead preamp down at least 9 dB.',
    ]);
    expect(second.id).toBe('flip-overhead');
  });

  it('asks for files that start together instead of more kicks', () => {
    const list = actions(reportOf(lateFigures)).filter((action) => !action.leave);
    expect(list.map((action) => action.id)).toEqual(['export-together']);
  });

  it('warns where it can hurt', () => {
    expect(actions(reportOf({ kick: lowTrack }))[0].detail).toContain('Lower the headphones first.');
    expect(actions(reportOf({ agreement: flipFigures }))[0].detail).toContain('Mute the monitors first.');
  });

  it('asks for the take that would settle what can’t be told', () => {
    expect(actions(oneHit).map((action) => action.id)).toContain('record-kicks');
    expect(actions(small).map((action) => action.id)).toContain('compare-polarities');
    const silent = trackFigures({ noiseFloorDbfs: null, noiseFloorReason: 'no-quiet-second' });
    expect(actions(reportOf({ kick: silent, overhead: silent })).map((action) => action.id)).toContain(
      'leave-silence',
    );
  });

  it('has only things to leave after a good take, and no id twice', () => {
    expect(actions().every((action) => action.leave)).toBe(true);
    const ids = actions().map((action) => action.id);
    expect(new Set(ids).size).toBe(ids.length);
  });
});

const droppedOut = trackFigures({ dropouts: { count: 13, firstAtS: 3.2 } });
const humming = trackFigures({ hum: { mainsHz: 50, levelDbfs: -56.2 } });
const squashed = trackFigures({ looksFlattened: true });

describe('a take in the table', () => {
  const all = [
    [
      'fix',
      'Flip the overhead. Turn the kick down 6.5 dB.',
      reportOf({ agreement: flipFigures, kick: hotTrack }),
    ],
    ['fix', 'Clipped in three places. Kick down 9 dB or more.', reportOf({ kick: clippedTrack })],
    ['good', 'Good take. Keep everything where it is.', reportOf()],
    ['watch', 'Overhead is low. Turn it up 12 dB.', reportOf({ overhead: lowTrack })],
    ['watch', 'Kick is hot. Turn it down 6.5 dB.', reportOf({ kick: hotTrack })],
    ['good', 'Levels are right. Polarity: either way.', eitherWay],
    ['watch', 'Overhead seems to drop out. Listen at 13 places.', reportOf({ overhead: droppedOut })],
    ['watch', 'Overhead looks squashed. Switch off any limiter.', reportOf({ overhead: squashed })],
    ['watch', 'Overhead hums: −56 dBFS. Try another cable.', reportOf({ overhead: humming })],
    ['watch', 'Noisy overhead: −52 dBFS. Look for the source.', noisy],
    ['fix', 'Overhead file 320 ms late. Line the files up.', reportOf(lateFigures)],
    ['fix', 'Flip the overhead. Look for the noise.', { ...noisy, agreement: flipFigures }],
    ['cannot-tell', 'No kick hit found. Play eight hard ones.', noHits],
    ['watch', 'Polarity unsure. Compare by ear.', small],
    ['cannot-tell', 'The overhead is silent. Check its cable.', reportOf({ overhead: silentTrack })],
  ] as const;

  it.each(all)('%s: %s', (status, text, figures) => {
    const summary = takeSummary(figures);
    expect([summary.status, `${summary.strong} ${summary.rest}`.trim()]).toEqual([status, text]);
    // 360 px at 16 px hold about 50 letters of the sheet's typeface.
    expect(text.length).toBeLessThanOrEqual(50);
  });
});
