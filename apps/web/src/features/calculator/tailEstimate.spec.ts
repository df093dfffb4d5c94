import { roomReverberation } from '@thudline/dsp';
import type { KnownRoom } from './knownRoom';
import { tailEstimate } from './tailEstimate';
import { anotherPlan, fitting, planFrom, planParams, type TreatmentPlan } from './treatmentPlan';
import { getMaterial, treatments } from './treatments';

const surface = (place: KnownRoom['surfaces'][number]['place'], areaM2: number, materialId = 'plaster') => ({
  place,
  areaM2,
  materialId,
  guessed: false,
});
const room: KnownRoom = {
  size: { lengthM: 5, widthM: 3, heightM: 2 },
  volumeM3: 30,
  surfaces: [
    surface('floor', 15, 'concrete-floor'),
    surface('ceiling', 15),
    surface('front', 10),
    surface('back', 8),
    surface('back', 2, 'timber-door'),
    surface('left', 6),
    surface('right', 6),
  ],
  temperatureC: 20,
  temperatureGuessed: false,
  speedOfSoundMPerS: 343.2,
};
const plan: TreatmentPlan = { areaM2: 8, treatmentId: 'wool', thicknessCm: 10, spot: 'long-walls' };
const other: KnownRoom = { ...room, size: null, surfaces: [surface(null, 62)] };

describe('the tail of a room', () => {
  it('is what the formulas say of its surfaces, half of the plan on each of two walls', () => {
    const part = (areaM2: number, materialId: string) => ({
      areaM2,
      absorption: getMaterial(materialId).absorption,
    });
    const { before, after } = roomReverberation({
      volumeM3: 30,
      speedOfSoundMPerS: 343.2,
      surfaces: [part(15, 'concrete-floor'), part(45, 'plaster'), part(2, 'timber-door')],
      treatments: [{ ...part(8, 'fibre-100-mm'), covers: 1 }],
    });
    const { bands } = tailEstimate(room, plan);
    bands.forEach((band, i) => {
      expect(band.before.eyringS).toBeCloseTo(before[i].eyringS ?? NaN, 9);
      expect(band.after.eyringS).toBeCloseTo(after[i].eyringS ?? NaN, 9);
      expect(band.after.sabineS).toBeCloseTo(after[i].sabineS ?? NaN, 9);
    });
  });

  it('gets shorter with more, and thicker, wool', () => {
    const tailAt = (changed: Partial<TreatmentPlan>, band: number) =>
      tailEstimate(room, { ...plan, ...changed }).bands[band].after.eyringS ?? NaN;
    expect(tailAt({ areaM2: 12 }, 2)).toBeLessThan(tailAt({ areaM2: 8 }, 2));
    expect(tailAt({ thicknessCm: 10 }, 0)).toBeLessThan(tailAt({ thicknessCm: 5 }, 0));
  });

  it('covers a whole wall, with the door in it, and no more', () => {
    const whole = fitting({ ...plan, spot: 'back', areaM2: 99 }, room);
    expect(whole.areaM2).toBe(10);
    expect(() => tailEstimate(room, whole)).not.toThrow();
  });

  it('of a room that is no box is told from its volume', () => {
    const told = tailEstimate(other, fitting(plan, other));
    expect(told.bands[2].after.eyringS).toBeLessThan(told.bands[2].before.eyringS ?? 0);
    expect(told.schroederHz).toBeGreaterThan(100);
  });

  it('is told for everything that can be brought in', () => {
    for (const { id, layers } of treatments)
      for (const { thicknessCm } of layers)
        for (const band of tailEstimate(room, { ...plan, treatmentId: id, thicknessCm }).bands)
          expect(band.after.eyringS).toBeLessThanOrEqual(band.before.eyringS ?? 0);
  });
});

describe('a plan', () => {
  it('comes back from the address as it was put there', () => {
    const curtain: TreatmentPlan = { areaM2: 4.5, treatmentId: 'curtain', thicknessCm: null, spot: 'back' };
    for (const each of [plan, curtain]) expect(planFrom(planParams(each), room)).toEqual(each);
  });

  it('is the first idea where the address holds none or nonsense', () => {
    for (const text of ['', 'm2=-4&of=moss&cm=x&on=roof', 'm2=Infinity&on=anywhere'])
      expect(planFrom(new URLSearchParams(text), room)).toEqual(plan);
  });

  it('gets a thickness there is and a spot there is', () => {
    expect(fitting({ ...plan, treatmentId: 'curtain' }, room).thicknessCm).toBeNull();
    expect(fitting({ ...plan, thicknessCm: 7 }, room).thicknessCm).toBe(10);
    expect(fitting(plan, other).spot).toBe('anywhere');
  });

  it('is followed by another until the first comes again', () => {
    let next = plan;
    const seen = Array.from({ length: 5 }, () => (next = anotherPlan(next, room)));
    expect(new Set(seen.map((each) => planParams(each).toString())).size).toBe(5);
    expect(seen[4]).toEqual(plan);
    expect(planParams(anotherPlan(other.size ? plan : fitting(plan, other), other)).toString()).not.toBe(
      planParams(fitting(plan, other)).toString(),
    );
  });
});
