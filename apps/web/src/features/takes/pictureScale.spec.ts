import { isBelowAxis, levelLabels, levelPercent, lowEndLabels, lowEndPercent } from './pictureScale';

const target = (lowDbfs: number, highDbfs: number) => ({ lowDbfs, highDbfs, aimDbfs: lowDbfs });
const texts = (lowDbfs: number, highDbfs: number) =>
  levelLabels(target(lowDbfs, highDbfs)).map((label) => label.text);

describe('the level axis', () => {
  it('gives every decibel 7.75 px in a column of 226 px, as drawn', () => {
    expect(((levelPercent(-6) - levelPercent(-12)) / 100) * 226).toBeCloseTo(6 * 7.75, 0);
  });
  it('keeps what lies outside at its ends', () => {
    expect(levelPercent(-60)).toBe(levelPercent(-24));
    expect(levelPercent(3)).toBe(levelPercent(0));
    expect([-24.1, -24, -12].map(isBelowAxis)).toEqual([true, false, false]);
  });
  it('names both ends and the target', () => {
    expect(texts(-12, -6)).toEqual(['−24', '−12', '−6', '0']);
  });
  it('leaves out an end that would touch the target’s number', () => {
    expect(texts(-22, -2)).toEqual(['−22', '−2']);
  });
  it('leaves out a target end that is off the axis', () => {
    expect(texts(-30, -10)).toEqual(['−24', '−10', '0']);
  });
});

describe('the low-end axis', () => {
  it('has zero in the middle and 18 px a decibel in a column of 128 px', () => {
    expect(lowEndPercent(0)).toBeCloseTo(50, 5);
    expect(((lowEndPercent(1) - lowEndPercent(0)) / 100) * 128).toBeCloseTo(18, 0);
  });
  it('keeps its outer numbers inside the column', () => {
    expect(lowEndLabels.map(({ text, anchor }) => [text, anchor])).toEqual([
      ['−3', 'start'],
      ['0', undefined],
      ['+3 dB', 'end'],
    ]);
  });
});
