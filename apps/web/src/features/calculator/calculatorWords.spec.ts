import { assumptions } from './assumptions';
import {
  alongWords,
  groupWords,
  headWords,
  kitSentence,
  measuredWords,
  measuresWords,
  missingWords,
  planWords,
  tailsSentence,
} from './calculatorWords';
import type { BandEstimate } from './tailEstimate';
import type { TreatmentPlan } from './treatmentPlan';
import type { RoomMode } from '@thudline/dsp';

const plan: TreatmentPlan = { areaM2: 8, treatmentId: 'wool', thicknessCm: 10, spot: 'long-walls' };
const centres = [125, 250, 500, 1000, 2000, 4000];
const bandsOf = (before: number[], after: number[]): BandEstimate[] =>
  centres.map((centreHz, i) => ({
    centreHz,
    before: { eyringS: before[i], sabineS: before[i] },
    after: { eyringS: after[i], sabineS: after[i] },
  }));
const garage = bandsOf([1.62, 0.94, 0.66, 0.45, 0.42, 0.43], [0.66, 0.4, 0.33, 0.26, 0.25, 0.25]);
const mode = (order: RoomMode['order'], frequencyHz: number): RoomMode => ({
  order,
  frequencyHz,
  kind: (['axial', 'tangential', 'oblique'] as const)[order.filter((n) => n > 0).length - 1],
});
const low = mode([1, 1, 0], 64.4);
const axial = mode([2, 0, 0], 66);
const resonances = {
  all: [low, axial],
  shownToHz: 132,
  groups: [[low, axial]],
  boom: [low, axial],
  first: axial,
};

describe('the sentence the page opens with', () => {
  it('says what the plan does to 500 Hz, and what it leaves', () => {
    expect(headWords({ bands: garage, plan, resonances }, 'metre')).toEqual({
      strong: '8 m² of wool would calm 500 Hz:',
      rest: '0.7 s becomes about 0.3. The boom at 65 Hz stays.',
    });
  });

  it('says so where it does little, with as many digits as tell the two apart', () => {
    const hardly = bandsOf([1, 1, 0.66, 1, 1, 1], [1, 1, 0.65, 1, 1, 1]);
    expect(headWords({ bands: hardly, plan, resonances: null }, 'foot')).toEqual({
      strong: '86 ft² of wool would hardly change 500 Hz:',
      rest: '0.66 s becomes about 0.65.',
    });
  });

  it('promises nothing about a boom in the octaves of the table', () => {
    const high = { ...resonances, boom: [mode([1, 0, 0], 95), mode([0, 1, 0], 96)] };
    expect(headWords({ bands: garage, plan, resonances: high }, 'metre').rest).not.toContain('stays');
  });
});

describe('the sentence over the tails', () => {
  const flat = [1, 1, 1, 1, 1, 1];
  it.each<[string, number[], number[]]>([
    ['In every octave the tail would halve or better.', flat, flat.map(() => 0.4)],
    [
      'From 1 kHz up the tail would halve or better; the others change less.',
      flat,
      [0.9, 0.8, 0.7, 0.5, 0.4, 0.4],
    ],
    ['At 125 Hz the tail would halve or better; the higher octaves change less.', flat, [0.5, 1, 1, 1, 1, 1]],
    ['It does most at 2 kHz: 30 % shorter.', flat, [1, 1, 1, 1, 0.7, 0.8]],
    ['Hardly anything changes: less than a tenth in every octave.', flat, flat.map(() => 0.95)],
  ])('is “%s”', (sentence, before, after) => {
    expect(tailsSentence(bandsOf(before, after))).toBe(sentence);
  });

  it('says where the rest is short already', () => {
    expect(tailsSentence(garage)).toBe(
      'Up to 500 Hz the tail would halve or better; the higher octaves are short already.',
    );
  });
});

describe('words of the calculator', () => {
  it('tell a plan', () => {
    expect(planWords(plan, 'metre')).toBe('8 m² of mineral wool, 48 kg/m³, 10 cm thick, on both long walls');
    expect(planWords({ areaM2: 4.5, treatmentId: 'curtain', thicknessCm: null, spot: 'back' }, 'foot')).toBe(
      '48 ft² of heavy curtain, draped, on the back wall',
    );
  });

  it('tell which way a mode stands', () => {
    expect([low, axial, mode([2, 0, 1], 97), mode([0, 0, 3], 200)].map(alongWords)).toEqual([
      'length × width',
      'length, twice',
      'length twice × height',
      'height, three times',
    ]);
  });

  it('name modes that lie together', () => {
    expect(groupWords([low, axial])).toBe('64.4 and 66.0 Hz: two close together, a boom');
    expect(groupWords([mode([1, 0, 0], 57), mode([0, 1, 0], 57)])).toBe(
      '57.0 Hz: two close together, a boom',
    );
  });

  it('say how the kit stands and where to try', () => {
    const move = { distanceM: 0.5, toward: 'back' as const };
    expect(kitSentence(axial, { stand: 'none', move }, 'metre')).toBe(
      'At 66 Hz the kit stands where the room gives nothing; try half a metre toward the back wall.',
    );
    expect(kitSentence(axial, { stand: 'strong', move: null }, 'foot')).toContain('booms most; moving it');
    expect(kitSentence(axial, null, 'metre')).toContain('put the kit on the room’s plan');
  });

  it('ask for what is missing', () => {
    expect(missingWords(['length', 'width', 'height'])).toBe('its length, width and height');
    expect(missingWords(['volume'])).toBe('its volume');
  });

  it('keep what was measured and what is estimated apart', () => {
    const point = { takeId: '', number: 8, recordedAt: '', value: 0.38, iqr: null, setup: null };
    expect(measuredWords([point], 0.45)).toMatch(
      /^Take 8’s snare dies in 0.38 s at 1 kHz; the estimate says 0.45. They aren’t the same thing:/,
    );
    expect(measuredWords([], 0.45)).toContain('record eight hard snare hits');
  });

  it('tell a room’s measures in the reader’s unit', () => {
    const size = { lengthM: 5.2, widthM: 3.1, heightM: 2.4 };
    expect(measuresWords({ size, volumeM3: 38.688 }, 'metre')).toBe('5.20 × 3.10 × 2.40 m, 38.7 m³');
    expect(measuresWords({ size, volumeM3: 38.688 }, 'foot')).toBe('17.1 × 10.2 × 7.9 ft, 1366 ft³');
    expect(measuresWords({ size: null, volumeM3: 40 }, 'metre')).toBe('not a box, 40.0 m³');
  });
});

describe('what the estimate takes for granted', () => {
  const side = (place: 'floor' | 'front' | 'back' | 'left' | 'right', guessed: boolean) => ({
    place,
    guessed,
    areaM2: 5,
    materialId: 'plaster',
  });
  const room = {
    size: { lengthM: 5, widthM: 3, heightM: 2 },
    volumeM3: 30,
    surfaces: [
      side('floor', true),
      ...(['front', 'back', 'left', 'right'] as const).map((s) => side(s, true)),
    ],
    temperatureC: 20,
    temperatureGuessed: true,
    speedOfSoundMPerS: 343,
  };
  const options = { schroederHz: 239.6, settings: { temperatureUnit: 'fahrenheit' as const } };

  it('names the table, what nobody wrote down, the temperature and where modes rule', () => {
    expect(assumptions(room, plan, options)).toEqual([
      'A box with hard walls, sound spread evenly.',
      expect.stringContaining('Bies, Hansen and Howard, 5th ed., table 6.2'),
      'Nobody wrote down what the walls and the floor are: plaster or brick is taken, so now may look too long.',
      '68 °F, because none is written down.',
      'Below about 240 Hz single modes rule, and a reverberation time says little.',
    ]);
  });

  it('leaves out what is known', () => {
    const known = { ...room, surfaces: [side('floor', false)], temperatureGuessed: false };
    expect(assumptions(known, plan, { ...options, schroederHz: null })).toHaveLength(2);
  });
});
