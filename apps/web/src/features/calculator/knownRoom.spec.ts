import { sampleRoom } from '../../testing/sampleRooms';
import { areaOf, knownRoom, type KnownRoom } from './knownRoom';

const known = (overrides: Parameters<typeof sampleRoom>[0] = {}): KnownRoom => {
  const answer = knownRoom(sampleRoom(overrides), 20);
  if ('missing' in answer) throw new Error(`missing ${answer.missing.join()}`);
  return answer.known;
};
const areas = ({ surfaces }: KnownRoom, place: string | null) =>
  surfaces.filter((surface) => surface.place === place).map(({ areaM2 }) => Number(areaM2.toFixed(2)));

describe('what is known of a room', () => {
  it('is its size, its air and every side, with hard walls where nobody said', () => {
    const room = known();
    expect(room.volumeM3).toBeCloseTo(38.688, 3);
    expect(room).toMatchObject({ temperatureC: 12, temperatureGuessed: false });
    expect(room.speedOfSoundMPerS).toBeCloseTo(338.5, 1);
    expect(room.surfaces.reduce((sum, { areaM2 }) => sum + areaM2, 0)).toBeCloseTo(
      2 * (5.2 * 3.1 + 5.2 * 2.4 + 3.1 * 2.4),
      9,
    );
    expect(room.surfaces.filter(({ guessed }) => !guessed).map(({ place }) => place)).toEqual(['floor']);
    expect(room.surfaces.find(({ place }) => place === 'left')).toMatchObject({ materialId: 'plaster' });
  });

  it('takes the usual temperature where none is written down', () => {
    expect(known({ temperatureC: null })).toMatchObject({ temperatureC: 20, temperatureGuessed: true });
  });

  it('gives patches their area and the rest of the side to what is left', () => {
    const room = known({
      surfaces: [
        { place: 'left', materialId: 'timber-door', areaM2: 2 },
        { place: 'left', materialId: 'brick-painted', areaM2: null },
        { place: 'floor', materialId: 'carpet-on-felt', areaM2: 1000 },
      ],
    });
    expect(areas(room, 'left')).toEqual([2, 5.44]);
    expect(areas(room, 'floor')).toEqual([Number((5.2 * 3.1).toFixed(2))]);
  });

  it('asks for every measure that is missing', () => {
    const box = { kind: 'box' as const, lengthM: 5, widthM: null, heightM: null };
    expect(knownRoom(sampleRoom({ shape: box }), 20)).toEqual({ missing: ['width', 'height'] });
    const other = { kind: 'other' as const, volumeM3: 40, surfaceM2: null };
    expect(knownRoom(sampleRoom({ shape: other }), 20)).toEqual({ missing: ['surface'] });
  });

  it('of a room that is no box is its volume and its surface', () => {
    const room = known({
      shape: { kind: 'other', volumeM3: 40, surfaceM2: 80 },
      surfaces: [
        { place: 'floor', materialId: 'wood-floor', areaM2: 15 },
        { place: 'left', materialId: 'plaster', areaM2: null },
        { place: 'ceiling', materialId: 'gypsum-on-studs', areaM2: null },
      ],
    });
    expect(room.size).toBeNull();
    expect(areas(room, null)).toEqual([15, 32.5, 32.5]);
  });
});

describe('the area of a side', () => {
  it('is that of a box: the front and the back are along its length', () => {
    const size = { lengthM: 5, widthM: 3, heightM: 2 };
    expect(
      (['floor', 'front', 'back', 'left', 'right'] as const).map((place) => areaOf(place, size)),
    ).toEqual([15, 10, 10, 6, 6]);
  });
});
