import { sameFilesWords } from './sameFilesWords';

const take = { id: 'a', number: 12, title: 'felt beater' };

describe('files that were sent before', () => {
  it('are named with the take they are', () => {
    expect(
      sameFilesWords([
        { name: 'kick.wav', take },
        { name: 'oh.wav', take },
      ]),
    ).toEqual([
      {
        takeId: 'a',
        count: 2,
        strong: 'You sent these files before:',
        rest: 'they are take 12, “felt beater”.',
      },
    ]);
  });

  it('are told one by one where they are in different takes, or only one was sent', () => {
    const other = { id: 'b', number: 14, title: '' };
    expect(
      sameFilesWords([
        { name: 'kick.wav', take },
        { name: 'oh.wav', take: other },
      ]),
    ).toEqual([
      {
        takeId: 'a',
        count: 1,
        strong: 'kick.wav was sent before:',
        rest: 'it is in take 12, “felt beater”.',
      },
      { takeId: 'b', count: 1, strong: 'oh.wav was sent before:', rest: 'it is in take 14.' },
    ]);
    expect(sameFilesWords([])).toEqual([]);
  });
});
