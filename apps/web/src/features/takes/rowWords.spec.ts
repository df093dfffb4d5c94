import { defaultUserSettings } from '@thudline/contracts';
import { sampleListItem } from '../../testing/sampleList';
import { measurement } from '../../testing/sampleData';
import { levelsInWords, lowEndInWords, measuringWords, takeName, unmeasuredWords } from './rowWords';

const { target } = defaultUserSettings;

describe('what a row says', () => {
  it('names the step of a measurement', () => {
    const words = (stage: 'fetching' | 'hits' | 'adding-up') =>
      measuringWords(measurement({ state: 'running', stage }));
    expect(words('fetching')).toBe('Measuring: fetching the files, step 1 of 5');
    expect(words('hits')).toBe('Measuring: finding the hits, step 3 of 5');
    expect(words('adding-up')).toBe('Measuring: adding up, step 5 of 5');
  });
  it('says when a take is still waiting', () => {
    expect(measuringWords(measurement({ state: 'queued' }))).toBe('Waiting to be measured');
  });
  it('says why a take was not measured', () => {
    expect(unmeasuredWords(measurement({ state: 'failed', reason: 'the files were unreadable.' })).rest).toBe(
      'the files were unreadable.',
    );
    expect(unmeasuredWords(measurement({ state: 'cancelled' })).rest).toMatch(/you stopped it/);
  });
  it('tells the level picture in words', () => {
    const take = sampleListItem({ kickPeakDbfs: -2.7, overheadPeakDbfs: -8.4 });
    expect(levelsInWords(take, target)).toBe(
      'Hardest hit: kick −2.7 dBFS, above the target; overhead −8.4 dBFS, on target.',
    );
    const clipped = sampleListItem({ kickPeakDbfs: null, kickClipped: true, overheadPeakDbfs: null });
    expect(levelsInWords(clipped, target)).toBe('Hardest hit: kick clipped; overhead without a hit.');
  });
  it('tells the low end in words', () => {
    expect(lowEndInWords(-0.72)).toBe('Low end of the two added: −0.7 dB.');
    expect(lowEndInWords(1.44)).toBe('Low end of the two added: +1.4 dB.');
    expect(lowEndInWords(null)).toMatch(/can’t tell/);
  });
  it('names a take without a title by its number', () => {
    expect(takeName({ number: 3, title: '' })).toBe('take 3');
    expect(takeName({ number: 3, title: 'rug' })).toBe('take 3, rug');
  });
});
