import { decibel, degree, keptNumber, lengthUnitOf, shownText } from './fieldUnits';

const centimetre = lengthUnitOf('metre');
const inch = lengthUnitOf('foot');

describe('a number of a setup', () => {
  it('is read with a comma, a unit behind it, or a real minus sign', () => {
    expect(keptNumber('8', centimetre)).toBe(8);
    expect(keptNumber(' 31,5 dB', decibel)).toBe(31.5);
    expect(keptNumber('−4 cm', centimetre)).toBe(-4);
    expect(keptNumber('10°', degree)).toBe(10);
  });

  it('is nothing where the field is empty, and no number where it is none', () => {
    expect(keptNumber('  ', centimetre)).toBeNull();
    expect(keptNumber('near', centimetre)).toBeUndefined();
  });

  it('is kept in centimetres whatever it is written in, and comes back as it was written', () => {
    expect(keptNumber('35.4', inch)).toBeCloseTo(89.92, 9);
    for (const written of ['3.1', '35.4', '−0.7', '12']) {
      expect(shownText(keptNumber(written, inch) ?? null, inch)).toBe(written);
    }
    expect(shownText(90, inch)).toBe('35.4');
    expect(shownText(null, inch)).toBe('');
  });
});
