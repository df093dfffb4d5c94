import { sampleReport } from '../../testing/sampleData';
import { pinWords, writerWords } from './noteWords';

const report = sampleReport();

describe('what a note speaks of', () => {
  it('is told in words and as time', () => {
    expect(pinWords({ kind: 'take' }, report)).toBe('');
    expect(pinWords({ kind: 'time', timeS: 62.44 }, report)).toBe('1:02.4');
    expect(pinWords({ kind: 'finding', topic: 'adding-up' }, report)).toBe('Adding up');
  });

  it('is the loudest kick, or which kick hit, also where another version finds it a little later', () => {
    expect(pinWords({ kind: 'hit', timeS: 4.3 }, report)).toBe('loudest kick, 0:04.3');
    expect(pinWords({ kind: 'hit', timeS: 6.41 }, report)).toBe('kick hit 3, 0:06.4');
  });

  it('is a hit and no more where none is found there any more', () => {
    expect(pinWords({ kind: 'hit', timeS: 5.8 }, report)).toBe('a hit, 0:05.8');
  });
});

describe('who wrote a note', () => {
  it('says of a guest that the name is theirs to choose', () => {
    expect(writerWords({ name: 'Oda', as: 'reader' })).toBe('Oda');
    expect(writerWords({ name: 'Juno', as: 'guest' })).toBe('Juno, by link');
    expect(writerWords({ name: null, as: 'reader' })).toBe('Somebody who has left');
  });
});
