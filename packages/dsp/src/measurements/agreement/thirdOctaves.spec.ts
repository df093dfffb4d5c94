import { thirdOctaves, zones } from './thirdOctaves';

describe('third-octave bands', () => {
  // IEC 61260-1:2014 equations 1–5, as python-acoustics tabulates them; three decimals.
  it.each([
    ['25', 25.119, 22.387, 28.184],
    ['31.5', 31.623, 28.184, 35.481],
    ['40', 39.811, 35.481, 44.668],
    ['50', 50.119, 44.668, 56.234],
    ['63', 63.096, 56.234, 70.795],
    ['80', 79.433, 70.795, 89.125],
    ['100', 100, 89.125, 112.202],
    ['125', 125.893, 112.202, 141.254],
    ['160', 158.489, 141.254, 177.828],
    ['200', 199.526, 177.828, 223.872],
    ['250', 251.189, 223.872, 281.838],
    ['315', 316.228, 281.838, 354.813],
    ['400', 398.107, 354.813, 446.684],
    ['500', 501.187, 446.684, 562.341],
    ['630', 630.957, 562.341, 707.946],
    ['800', 794.328, 707.946, 891.251],
    ['1k', 1000, 891.251, 1122.018],
    ['1.25k', 1258.925, 1122.018, 1412.538],
    ['1.6k', 1584.893, 1412.538, 1778.279],
    ['2k', 1995.262, 1778.279, 2238.721],
    ['2.5k', 2511.886, 2238.721, 2818.383],
    ['3.15k', 3162.278, 2818.383, 3548.134],
    ['4k', 3981.072, 3548.134, 4466.836],
    ['5k', 5011.872, 4466.836, 5623.413],
    ['6.3k', 6309.573, 5623.413, 7079.458],
    ['8k', 7943.282, 7079.458, 8912.509],
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
