import { letteredCaveats, lettersOf } from './letteredCaveats';

describe('the letters of cautions', () => {
  it('go from top to bottom: the flip stands above the figures', () => {
    const { ofFlip, ofFigures } = letteredCaveats([
      { about: 'matching', text: 'A preamp changed.' },
      { about: 'the flip', text: 'The sound says otherwise.' },
      { about: 'hits', text: 'Too few.' },
    ]);
    expect(ofFlip).toEqual([{ about: 'the flip', text: 'The sound says otherwise.', letter: 'a' }]);
    expect(lettersOf(ofFigures)).toEqual(['b', 'c']);
  });
});
