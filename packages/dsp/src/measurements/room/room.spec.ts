import { SignalError } from '../../assert';
import { absorptionTable, type BandAbsorption } from './absorptionTable';
import { absorptionArea, eyringS, sabineS } from './reverberation';
import { modeGroups } from './modeGroups';
import { modePressure } from './modePressure';
import { roomModes, type RoomMode } from './roomModes';
import { roomReverberation } from './roomReverberation';
import { schroederFrequencyHz } from './schroederFrequency';

const FOOT_M = 0.3048;
/** The handbooks' speed of sound, 1130 ft/s. */
const HANDBOOK_SPEED = 1130 * FOOT_M;

describe('the modes of a room', () => {
  const size = { lengthM: 16 * FOOT_M, widthM: 12 * FOOT_M, heightM: 8 * FOOT_M };
  const modes = roomModes({ size, speedOfSoundMPerS: HANDBOOK_SPEED, highestHz: 142 });
  const hz = (name: string): number => modes.find(({ order }) => order.join('') === name)?.frequencyHz ?? NaN;

  // Ballou (ed.), Handbook for Sound Engineers, 4th ed., Table 6-4, p. 130; 110 and 111 computed from the formula.
  it.each([
    ['100', 35.31],
    ['010', 47.08],
    ['001', 70.63],
    ['200', 70.63],
    ['020', 94.17],
    ['300', 105.94],
    ['002', 141.25],
    ['030', 141.25],
    ['110', 58.85],
    ['111', 91.93],
  ])('%s lies at %d Hz', (name, frequencyHz) => {
    expect(Math.abs(hz(name) - frequencyHz)).toBeLessThan(0.01);
  });

  it('are in order of frequency, each once, with their kind', () => {
    const names = modes.map(({ order }) => order.join(''));
    expect(new Set(names).size).toBe(names.length);
    expect(names.slice(0, 3)).toEqual(['100', '010', '110']);
    modes.forEach(({ frequencyHz }, i) =>
      expect(frequencyHz).toBeGreaterThanOrEqual(modes[i - 1]?.frequencyHz ?? 0),
    );
    const kind = (name: string) => modes.find(({ order }) => order.join('') === name)?.kind;
    expect(['100', '110', '111'].map(kind)).toEqual(['axial', 'tangential', 'oblique']);
  });

  it('lie as the example says', () => {
    const example = { lengthM: 5, widthM: 4, heightM: 2.5 };
    const found = roomModes({ size: example, speedOfSoundMPerS: 343.2, highestHz: 40 });
    expect(found).toMatchObject([{ order: [1, 0, 0], kind: 'axial' }]);
    expect(found[0].frequencyHz).toBeCloseTo(34.32, 9);
  });

  it('are refused for a room that can’t be, and for more than can be listed', () => {
    const options = { size, speedOfSoundMPerS: 343, highestHz: 100 };
    expect(() => roomModes({ ...options, size: { ...size, heightM: 0 } })).toThrow(SignalError);
    expect(() => roomModes({ ...options, speedOfSoundMPerS: NaN })).toThrow(SignalError);
    expect(() => roomModes({ ...options, highestHz: 1e6 })).toThrow('modes');
  });
});

describe('the pressure of a mode', () => {
  const size = { lengthM: 5.2, widthM: 3.1, heightM: 2.4 };
  const at = (xM: number, yM = 0, zM = 0) => ({ xM, yM, zM });

  it('is all of it at every wall, and nothing where a half wave turns', () => {
    expect(modePressure([2, 0, 0], size, at(0))).toBe(1);
    expect(modePressure([2, 0, 0], size, at(5.2, 3.1, 2.4))).toBeCloseTo(1, 12);
    expect(modePressure([2, 0, 0], size, at(2.6))).toBeCloseTo(1, 12);
    for (const xM of [1.3, 3.9]) expect(modePressure([2, 0, 0], size, at(xM))).toBeCloseTo(0, 12);
  });

  it('is the product along the three directions', () => {
    const place = at(1, 1, 1);
    const alone = (
      [
        [1, 0, 0],
        [0, 2, 0],
        [0, 0, 1],
      ] as const
    ).map((order) => modePressure(order, size, place));
    expect(modePressure([1, 2, 1], size, place)).toBeCloseTo(alone[0] * alone[1] * alone[2], 12);
  });

  it('is refused in a room that can’t be', () => {
    expect(() => modePressure([1, 0, 0], { ...size, widthM: -3 }, at(0))).toThrow(SignalError);
  });
});

describe('modes that lie close together', () => {
  const of = (size: { lengthM: number; widthM: number; heightM: number }, highestHz: number) =>
    roomModes({ size, speedOfSoundMPerS: HANDBOOK_SPEED, highestHz });
  const names = (groups: RoomMode[][]) => groups.map((group) => group.map(({ order }) => order.join('')));

  it('are those that a handbook’s room has at one frequency', () => {
    // Ballou, Table 6-4: 16 × 12 × 8 ft has 70.63 Hz along the length, twice, and along the height.
    const size = { lengthM: 16 * FOOT_M, widthM: 12 * FOOT_M, heightM: 8 * FOOT_M };
    expect(names(modeGroups(of(size, 75), 2))).toEqual([['001', '200']]);
  });

  it('are all three of a cube, and none where each stands alone', () => {
    const cube = { lengthM: 3, widthM: 3, heightM: 3 };
    expect(names(modeGroups(of(cube, 60), 2))[0]).toEqual(['001', '010', '100']);
    expect(modeGroups(of({ lengthM: 5.2, widthM: 3.1, heightM: 2.4 }, 60), 2)).toEqual([]);
    expect(modeGroups([], 2)).toEqual([]);
  });

  it('need a distance', () => {
    expect(() => modeGroups([], 0)).toThrow(SignalError);
  });
});

describe('the Schroeder frequency', () => {
  // Computed from the formula, 2000·√(T/V).
  it.each([
    [0.54, 105.565, 143.04],
    [0.4, 50, 178.89],
    [1, 200, 141.42],
  ])('of %d s and %d m³ is %d Hz', (reverberationS, volumeM3, expectedHz) => {
    expect(Math.abs(schroederFrequencyHz({ reverberationS, volumeM3 }) - expectedHz)).toBeLessThan(0.01);
  });

  it('is refused for no volume', () => {
    expect(() => schroederFrequencyHz({ reverberationS: 1, volumeM3: 0 })).toThrow(SignalError);
  });
});

describe('Sabine and Eyring', () => {
  const areas = [
    { areaM2: 240, absorption: 0.1 },
    { areaM2: 600, absorption: 0.25 },
    { areaM2: 500, absorption: 0.45 },
  ];
  const hall = { volumeM3: 3000, areas, speedOfSoundMPerS: 343 };

  it('are those of python-acoustics', () => {
    // Its tests' values, commit 99d79206.
    expect(sabineS(hall)).toBeCloseTo(1.211382149, 8);
    expect(eyringS(hall)).toBeCloseTo(1.020427763, 8);
  });

  it('count more than everything as everything', () => {
    const over = { ...hall, areas: [{ areaM2: 100, absorption: 1.15 }] };
    expect(absorptionArea(over.areas)).toBe(100);
    expect(eyringS(over)).toBe(0);
    expect(sabineS(over)).toBeCloseTo((24 * Math.LN10 * 3000) / (343 * 100), 9);
  });

  it('agree where little is absorbed, and can’t be told where nothing is', () => {
    const live = { ...hall, areas: [{ areaM2: 1340, absorption: 0.001 }] };
    expect((sabineS(live) ?? NaN) / (eyringS(live) ?? NaN)).toBeCloseTo(1, 2);
    const bare = { ...hall, areas: [{ areaM2: 1340, absorption: 0 }] };
    expect([sabineS(bare), eyringS(bare)]).toEqual([null, null]);
  });

  it('refuse what can’t be', () => {
    expect(() => sabineS({ ...hall, areas: [] })).toThrow(SignalError);
    expect(() => sabineS({ ...hall, volumeM3: -1 })).toThrow(SignalError);
    expect(() => eyringS({ ...hall, areas: [{ areaM2: 1, absorption: 2 }] })).toThrow(SignalError);
  });
});

describe('the reverberation of a room', () => {
  // Everest, The Master Handbook of Acoustics, 4th ed., p. 163, Examples 1 and 2: 23.3 × 16 × 10 ft.
  const FT2_M2 = FOOT_M * FOOT_M;
  const volumeM3 = 23.3 * 16 * 10 * FOOT_M ** 3;
  const surfaces = [
    { areaM2: 373 * FT2_M2, absorption: [0.01, 0.01, 0.015, 0.02, 0.02, 0.02] as BandAbsorption },
    { areaM2: 1159 * FT2_M2, absorption: [0.29, 0.1, 0.05, 0.04, 0.07, 0.09] as BandAbsorption },
  ];
  const tile = {
    areaM2: 340 * FT2_M2,
    absorption: [0.09, 0.28, 0.78, 0.84, 0.73, 0.64] as BandAbsorption,
    covers: null,
  };
  const room = { volumeM3, surfaces, speedOfSoundMPerS: HANDBOOK_SPEED };

  it('is Everest’s Example 2 with the tiles, and Example 1 without', () => {
    const { before, after } = roomReverberation({ ...room, treatments: [tile] });
    const seconds = after.map((band) => band.sabineS ?? NaN);
    [0.49, 0.85, 0.56, 0.54, 0.54, 0.55].forEach((printed, i) =>
      // Printed with two decimals and a constant of 0.049.
      expect(Math.abs(seconds[i] - printed)).toBeLessThan(0.006),
    );
    const sabins = after.map((band) => band.absorptionM2 / FT2_M2);
    [370.4, 214.8, 328.8, 339.5, 336.8, 329.4].forEach((printed, i) =>
      expect(Math.abs(sabins[i] - printed)).toBeLessThan(0.11),
    );
    expect(Math.abs((before[0].sabineS ?? NaN) - 0.54)).toBeLessThan(0.006);
    expect(Math.abs((before[3].sabineS ?? NaN) - 3.39)).toBeLessThan(0.006);
    expect(after.map((band) => band.centreHz)).toEqual([125, 250, 500, 1000, 2000, 4000]);
  });

  it('loses what a treatment hides', () => {
    const covering = { ...tile, covers: 1 };
    const { after } = roomReverberation({ ...room, treatments: [covering] });
    // At 1 kHz: 373 · 0.02 + (1159 − 340) · 0.04 + 340 · 0.84 sabins.
    expect(after[3].absorptionM2 / FT2_M2).toBeCloseTo(325.82, 6);
    const whole = { ...covering, areaM2: surfaces[1].areaM2 };
    const { after: hidden } = roomReverberation({ ...room, treatments: [whole] });
    expect(hidden[3].absorptionM2 / FT2_M2).toBeCloseTo(373 * 0.02 + 1159 * 0.84, 6);
  });

  it('changes nothing without treatment', () => {
    const { before, after } = roomReverberation(room);
    expect(after).toEqual(before);
  });

  it('refuses to cover more than there is, and what isn’t there', () => {
    const big = { ...tile, covers: 0, areaM2: 40 };
    expect(() => roomReverberation({ ...room, treatments: [big] })).toThrow('room for');
    expect(() => roomReverberation({ ...room, treatments: [{ ...tile, covers: 7 }] })).toThrow(
      'no surface 7',
    );
  });
});

describe('the table of absorption', () => {
  it('holds each material once, six octaves between 0 and 1, with its source', () => {
    expect(new Set(absorptionTable.map(({ id }) => id)).size).toBe(absorptionTable.length);
    for (const { absorption, source, name } of absorptionTable) {
      expect(absorption).toHaveLength(6);
      for (const value of absorption) expect(value >= 0 && value <= 1).toBe(true);
      expect([name, source]).not.toContain('');
    }
  });

  it('prints gypsum board on studs as Bies, Hansen & Howard, Table 6.2', () => {
    expect(absorptionTable.find(({ id }) => id === 'gypsum-on-studs')).toMatchObject({
      absorption: [0.29, 0.1, 0.05, 0.04, 0.07, 0.09],
    });
  });
});
