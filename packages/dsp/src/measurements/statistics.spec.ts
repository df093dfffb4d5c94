import { interquartileRange, median, quantile } from './statistics';

describe('medians and quartiles', () => {
  // Linear interpolation, type 7 of Hyndman and Fan 1996; values from numpy.
  const six = [36, 7, 41, 15, 40, 39];

  it('are those of the published example', () => {
    expect(median(six)).toBe(37.5);
    expect(quantile(six, 0.25)).toBe(20.25);
    expect(quantile(six, 0.75)).toBe(39.75);
    expect(interquartileRange(six)).toBe(19.5);
  });

  it('need a value, and two for a range', () => {
    expect(median([])).toBeNull();
    expect(median([3])).toBe(3);
    expect(interquartileRange([3])).toBeNull();
  });

  it('leave the list as it was', () => {
    median(six);
    expect(six).toEqual([36, 7, 41, 15, 40, 39]);
  });
});
