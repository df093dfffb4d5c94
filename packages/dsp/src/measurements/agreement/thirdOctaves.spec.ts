import { thirdOctaves, zones } from './thirdOctaves';

describe('third-octave bands', () => {
  // IEC 61260-1:2014 equations 1–5, table as in check-values section 5; it prints three decimals.
  it.each([
    ['25', 25.119, 22.387, 28.184],
    ['63', 63.096, 56.234, 70.795],
    ['80', 79.433, 70.795, 89.125],
    ['160', 158.489, 141.254, 177.828],
    ['1k', 1000, 891.251, 1122.018],
    ['3.15k', 3162.278, 2818.383, 3548.134],
    ['10k', 10000, 8912.509, 11220.185],
  ])('%s Hz lies where the standard puts it', (nominal, centreHz, lowHz, highHz) => {
    const band = thirdOctaves.find((each) => each.nominal === nominal);
    expect(band?.centreHz).toBeCloseTo(centreHz, 3);
    expect(band?.lowHz).toBeCloseTo(lowHz, 3);
    expect(band?.highHz).toBeCloseTo(highHz, 3);
  });

  it('are 27 and leave no gap', () => {
    expect(thirdOctaves).toHaveLength(27);
    thirdOctaves.slice(1).forEach((band, i) => expect(band.lowHz).toBeCloseTo(thirdOctaves[i].highHz, 9));
  });

  it('make up five zones without gap or overlap', () => {
    expect(zones.map((zone) => zone.name)).toEqual(['deep', 'thump', 'body', 'knock', 'click']);
    zones.slice(1).forEach((zone, i) => expect(zone.lowHz).toBeCloseTo(zones[i].highHz, 9));
    expect(zones[0].lowHz).toBeCloseTo(22.387, 3);
  });
});
