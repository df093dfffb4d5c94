import { sampleReport } from '../../testing/sampleData';
import { allDoneWords, bigActions } from './bigActions';

describe('actions in big print', () => {
  it('says each in a few words, with the mark of its finding', () => {
    expect(bigActions(sampleReport())).toEqual([
      {
        id: 'flip-overhead',
        status: 'fix',
        strong: 'Flip the overhead',
        detail: 'Press the polarity switch on its preamp.',
      },
      {
        id: 'kick-gain',
        status: 'watch',
        strong: 'Kick down 6.5 dB',
        detail: 'Hardest hit should show about −9.',
      },
    ]);
  });

  it('keeps "at least" where a take clipped, and other sentences as they are', () => {
    const actions = [
      {
        id: 'overhead-gain',
        action: 'Turn the overhead preamp down at least 4 dB.',
        detail: '',
        leave: false,
      },
      { id: 'record-kicks', action: 'Record eight hard kicks with nothing else.', detail: '', leave: false },
    ];
    expect(bigActions({ actions, findings: [] }).map(({ strong }) => strong)).toEqual([
      'Overhead down at least 4 dB',
      'Record eight hard kicks with nothing else',
    ]);
  });

  it('leaves out what is to be left alone', () => {
    const actions = [{ id: 'polarity-leave', action: 'Leave it.', detail: '', leave: true }];
    expect(bigActions({ actions, findings: [] })).toEqual([]);
  });

  it('names the button for everything by how much there is', () => {
    expect([1, 2, 3].map(allDoneWords)).toEqual(['Done', 'Both done', 'All done']);
  });
});
