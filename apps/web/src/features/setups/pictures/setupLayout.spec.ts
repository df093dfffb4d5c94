import { emptySetup } from '@thudline/contracts';
import { lookFromAbove, lookFromSide, setupLayout } from './setupLayout';

const kick = { ...emptySetup.kick, insideCm: 8, offCentreCm: 4, heightCm: 28 };
const overhead = { ...emptySetup.overhead, aboveSnareCm: 90, towardKickCm: 9, awayFromHatCm: 8 };

describe('the two views of a setup', () => {
  it('share the axis from back to front', () => {
    const { kickMicrophone, overhead: over } = setupLayout({ kick, overhead }, 520);
    expect(kickMicrophone.above?.x).toBe(kickMicrophone.side?.x);
    expect(over.above?.x).toBe(over.side?.x);
  });

  it('are to one scale, with the floor at nothing', () => {
    const layout = setupLayout({ kick, overhead }, 520);
    expect(layout.pxPerCm).toBeCloseTo(1.72, 9);
    expect(layout.ySideOf(0)).toBe(layout.floorY);
    expect(layout.floorY - layout.kickMicrophone.side!.y).toBeCloseTo(28 * 1.72, 9);
    expect(layout.xOf(33) - layout.xOf(0)).toBeCloseTo(33 * 1.72, 9);
    expect(layout.kickMicrophone.above!.y - layout.yAboveOf(0)).toBeCloseTo(4 * 1.72, 9);
  });

  it('leave out what a field is missing for', () => {
    const flat = setupLayout({ kick: { ...kick, heightCm: null }, overhead: emptySetup.overhead }, 520);
    expect(flat.kickMicrophone.side).toBeNull();
    expect(flat.kickMicrophone.above).not.toBeNull();
    expect(flat.overhead).toEqual({ above: null, side: null });
  });

  it.each([
    ['very high', kick, { ...overhead, aboveSnareCm: 400 }],
    ['far in front', { ...kick, insideCm: -300 }, overhead],
    ['far to the sides', { ...kick, offCentreCm: 300 }, { ...overhead, awayFromHatCm: -300 }],
    ['far to the back', kick, { ...overhead, towardKickCm: -300 }],
  ])('hold a microphone that stands %s, also on a phone', (_, low, high) => {
    for (const widthPx of [520, 324]) {
      const layout = setupLayout({ kick: low, overhead: high }, widthPx);
      for (const { above, side } of [layout.kickMicrophone, layout.overhead]) {
        for (const point of [above!, side!]) {
          expect(point.x).toBeGreaterThanOrEqual(0);
          expect(point.x).toBeLessThanOrEqual(widthPx);
          expect(point.y).toBeGreaterThanOrEqual(0);
          expect(point.y).toBeLessThanOrEqual(layout.heightPx);
        }
        expect(above!.y).toBeLessThan(layout.sideTopY);
        expect(side!.y).toBeGreaterThan(layout.sideTopY);
      }
    }
  });
});

describe('where a microphone looks', () => {
  const middle = { x: 0, y: 0 };

  it('is at the beater until it is turned away', () => {
    const ahead = lookFromAbove({ x: 50, y: 0 }, middle, 0, 10);
    expect(ahead.x).toBeCloseTo(40, 9);
    expect(ahead.y).toBeCloseTo(0, 9);
    const aside = lookFromAbove({ x: 50, y: 0 }, middle, 90, 10);
    expect(aside.x).toBeCloseTo(50, 9);
    expect(aside.y).toBeCloseTo(-10, 9);
  });

  it('is down until it is tilted to the front', () => {
    expect(lookFromSide(middle, 0, 10)).toEqual({ x: 0, y: 10 });
    const front = lookFromSide(middle, 90, 10);
    expect(front.x).toBeCloseTo(10, 9);
    expect(front.y).toBeCloseTo(0, 9);
  });
});
