import { shortName } from './shortName';

it('a change’s name is written as far as whole words fit', () => {
  expect(shortName('Rug', 100)).toBe('Rug');
  expect(shortName('Kit moved to the middle', 90)).toBe('Kit moved …');
  expect(shortName('Kit moved to the middle', 30)).toBeNull();
  expect(shortName('Soundproofing', 50)).toBeNull();
});
