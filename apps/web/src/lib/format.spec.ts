import { bytes, clock, decibels, distance, hertz, number, signed } from './format';

describe('numbers on the page', () => {
  it('have a real minus sign and no negative zero', () => {
    expect(number(-2.66)).toBe('−2.7');
    expect(number(-0.02)).toBe('0.0');
    expect(decibels(-12, 0)).toBe('−12 dB');
  });

  it('say their sign where they are differences', () => {
    expect(signed(1.44)).toBe('+1.4');
    expect(signed(-1.44)).toBe('−1.4');
    expect(signed(0.01)).toBe('0.0');
  });

  it('tell times as a clock', () => {
    expect(clock(16.2)).toBe('0:16');
    expect(clock(59.97, true)).toBe('1:00.0');
    expect(clock(4.3, true)).toBe('0:04.3');
  });

  it('tell distances in the reader’s unit', () => {
    expect(distance(0.549, 'metre')).toBe('55 cm');
    expect(distance(1.254, 'metre')).toBe('1.25 m');
    expect(distance(0.549, 'foot')).toBe('1 ft 10 in');
    expect(distance(-0.2, 'foot')).toBe('−8 in');
  });

  it('shorten frequencies and sizes', () => {
    expect([31.5, 100, 1000, 3150].map(hertz)).toEqual(['31.5', '100', '1k', '3.15k']);
    expect(bytes(7_500_000)).toBe('7.5 MB');
    expect(bytes(120)).toBe('1 kB');
  });
});
