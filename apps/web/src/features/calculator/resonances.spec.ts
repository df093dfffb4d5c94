import { speedOfSoundMPerS } from '@thudline/dsp';
import { kitHint } from './kitHint';
import type { KnownRoom } from './knownRoom';
import { meanHz, roomResonances } from './roomResonances';

const size = { lengthM: 5.2, widthM: 3.1, heightM: 2.4 };
const room: KnownRoom = {
  size,
  volumeM3: 38.688,
  surfaces: [],
  temperatureC: 20,
  temperatureGuessed: false,
  speedOfSoundMPerS: speedOfSoundMPerS(20),
};
const resonances = roomResonances(room, 240)!;
const mode = (name: string) => resonances.all.find(({ order }) => order.join('') === name)!;
const kitAt = (kickXM: number, yM: number) => ({ xM: kickXM - 0.45, yM, turnedDeg: 0 });

describe('the resonances of a garage', () => {
  it('are those of its measures, lowest first, as far as single ones rule', () => {
    const hz = resonances.all.map(({ frequencyHz }) => Number(frequencyHz.toFixed(1)));
    expect(hz.slice(0, 8)).toEqual([33, 55.4, 64.4, 66, 71.5, 78.8, 86.1, 90.4]);
    expect(Math.max(...hz)).toBeLessThanOrEqual(240);
    expect(resonances.shownToHz).toBeCloseTo(132, 0);
  });

  it('have a boom where two low ones lie together, and its strongest is shown first', () => {
    expect(resonances.boom?.map(({ order }) => order.join(''))).toEqual(['110', '200']);
    expect(meanHz(resonances.boom!)).toBeCloseTo(65.2, 1);
    expect(resonances.first).toBe(mode('200'));
  });

  it('have none where all of the low end stand apart: the lowest is shown first', () => {
    const apart = roomResonances({ ...room, size: { lengthM: 2, widthM: 1.6, heightM: 1.2 } }, null)!;
    expect(apart.boom).toBeNull();
    expect(apart.first).toBe(apart.all[0]);
  });

  it('can’t be told of a room that is no box', () => {
    expect(roomResonances({ ...room, size: null }, 240)).toBeNull();
  });
});

describe('how the kit stands', () => {
  it('gets nothing at a place of none, and the way to a fair one', () => {
    expect(kitHint(mode('200'), size, kitAt(3.9, 1.5))).toEqual({
      stand: 'none',
      move: { distanceM: 0.5, toward: 'right' },
    });
  });

  it('booms at a wall, and the way leads off it', () => {
    const hint = kitHint(mode('010'), size, kitAt(2, 0.6));
    expect(hint.stand).toBe('strong');
    expect(hint.move).toEqual({ distanceM: 0.5, toward: 'back' });
  });

  it('is fair between strong and none', () => {
    expect(kitHint(mode('200'), size, kitAt(3.3, 1.5))).toEqual({ stand: 'some', move: null });
  });

  it('is the same everywhere between floor and ceiling', () => {
    expect(kitHint(mode('001'), size, kitAt(2, 1)).stand).toBe('same-everywhere');
  });

  it('counts which way the kit is turned', () => {
    const turned = { xM: 3.9, yM: 0.85, turnedDeg: 90 };
    expect(kitHint(mode('200'), size, turned).stand).toBe('none');
    expect(kitHint(mode('200'), size, { ...turned, turnedDeg: 0 }).stand).toBe('some');
  });
});
