import { distanceAxis } from './distanceAxis';

describe('the axis of distances', () => {
  it('goes in round steps to beyond the largest', () => {
    const { ticks, shareOf } = distanceAxis([93, 96], 'metre');
    expect(ticks.map(({ label }) => label)).toEqual(['0', '25', '50', '75', '100', '125', '150 cm']);
    expect(shareOf(75)).toBeCloseTo(0.5, 9);
    expect(shareOf(0)).toBe(0);
  });

  it('is in inches for whoever reads inches', () => {
    const { ticks, shareOf } = distanceAxis([93, 96], 'foot');
    expect(ticks.map(({ label }) => label)).toEqual(['0', '10', '20', '30', '40', '50', '60 in']);
    expect(shareOf(30 * 2.54)).toBeCloseTo(0.5, 9);
  });

  it('reaches below nothing where the overhead is nearer', () => {
    const { ticks, shareOf } = distanceAxis([-20], 'metre');
    expect(ticks[0].label).toBe('−30');
    expect(shareOf(-20)).toBeGreaterThan(0);
    expect(ticks.at(-1)?.label).toBe('10 cm');
  });

  it('holds whatever can be written down', () => {
    for (const lengthCm of [0, 3, 60, 250, 800, -800]) {
      const share = distanceAxis([lengthCm], 'metre').shareOf(lengthCm);
      expect(share).toBeGreaterThanOrEqual(0);
      expect(share).toBeLessThanOrEqual(1);
    }
  });
});
