import { positionWords, shortPosition, toKept, toShown, unitWord } from './positionWords';

const at = (position: number | null, label = '') => ({ position, label });

describe('where a take stands in a try-out', () => {
  it('is told in the reader’s unit and kept in centimetres', () => {
    expect(positionWords(at(100), 'cm', 'metre')).toBe('100 cm');
    expect(positionWords(at(100), 'cm', 'foot')).toBe('39.4 in');
    expect(toKept(toShown(87.5, 'cm', 'foot'), 'cm', 'foot')).toBeCloseTo(87.5, 9);
    expect(positionWords(at(45), 'degree', 'foot')).toBe('45°');
    expect(positionWords(at(-3.5), 'dB', 'metre')).toBe('−3.5 dB');
  });

  it('is a label where it has no number', () => {
    expect(positionWords(at(null, 'felt beater'), 'label', 'metre')).toBe('felt beater');
    expect(shortPosition(at(null, 'over the door'), 'cm', 'metre')).toBe('over the door');
    expect(shortPosition(at(null), 'cm', 'metre')).toBeNull();
    expect(unitWord('label', 'metre')).toBe('');
  });
});
