import { wordSides } from './wordSides';

const at = (x: number, letters = 30) => ({ x, words: 'x'.repeat(letters) });

describe('the words at two marks', () => {
  it('stand outward of one another, whichever is further', () => {
    expect(wordSides([at(250), at(260)], 520)).toEqual(['left', 'right']);
    expect(wordSides([at(260), at(250)], 520)).toEqual(['right', 'left']);
  });

  it('go into rows of their own where one has no room', () => {
    expect(wordSides([at(100), at(260)], 520)).toBeNull();
    expect(wordSides([at(250), at(400)], 520)).toBeNull();
    expect(wordSides([at(150), at(160)], 324)).toBeNull();
  });

  it('stand on the side with room where there is one mark', () => {
    expect(wordSides([at(100)], 520)).toEqual(['right']);
    expect(wordSides([at(450)], 520)).toEqual(['left']);
    expect(wordSides([at(160)], 324)).toBeNull();
    expect(wordSides([], 520)).toEqual([]);
  });
});
