import { roomModes } from '@thudline/dsp';
import { planLayout } from '../../rooms/pictures/planLayout';
import type { BandEstimate } from '../tailEstimate';
import { modeStripLayout, nearestMode, wordsX } from './modeStripLayout';
import { edgeWords, modeZones } from './modeZones';
import { tailRowsLayout } from './tailRowsLayout';
import { wallLine, wavePath } from './wallLine';
import { doorsInWalls, plannedFlat, plannedOnWalls, softOnWalls } from './wallStretches';

const size = { lengthM: 5.2, widthM: 3.1, heightM: 2.4 };
const modes = roomModes({ size, speedOfSoundMPerS: 343.2, highestHz: 140 });

describe('the strip of modes', () => {
  it.each([280, 704])('lies inside %d px, its numbers apart', (widthPx) => {
    const { strokes, ticks } = modeStripLayout(modes, { widthPx, toHz: 132 });
    for (const { x } of [...strokes, ...ticks]) {
      expect(x).toBeGreaterThanOrEqual(0);
      expect(x).toBeLessThanOrEqual(widthPx);
    }
    ticks.slice(1).forEach(({ x }, i) => expect(x - ticks[i].x).toBeGreaterThanOrEqual(44));
    expect(ticks[ticks.length - 1].text).toMatch(/ Hz$/);
    expect(strokes.every(({ mode }) => mode.frequencyHz < 134)).toBe(true);
  });

  it('gives the stroke that is nearest to a click', () => {
    const layout = modeStripLayout(modes, { widthPx: 704, toHz: 132 });
    expect(nearestMode(layout, layout.x(60))?.frequencyHz).toBeCloseTo(64.4, 1);
    expect(nearestMode(layout, -50)?.frequencyHz).toBeCloseTo(33, 1);
    expect(nearestMode({ strokes: [] }, 0)).toBeNull();
  });

  it('keeps words inside', () => {
    expect(wordsX(690, 'two close together', 704)).toBeLessThan(600);
    expect(wordsX(100, 'boom', 704)).toBe(100);
  });
});

describe('zones of a mode on the plan', () => {
  it('cover the plan once', () => {
    for (const order of [
      [2, 0, 0],
      [1, 1, 0],
      [0, 3, 1],
      [0, 0, 1],
    ] as const) {
      const { zones } = modeZones(order);
      expect(zones.reduce((sum, { width, height }) => sum + width * height, 0)).toBeCloseTo(1, 9);
      expect(zones.every(({ level }) => level >= 0 && level <= 4)).toBe(true);
    }
  });

  it('are strong at the walls and none half way through each half wave', () => {
    const { zones, nonesAlongLength, nonesAlongWidth } = modeZones([2, 0, 0]);
    const levelAt = (x: number) => zones.find((zone) => x >= zone.x && x < zone.x + zone.width)?.level;
    expect([0, 0.25, 0.5, 0.75, 0.999].map(levelAt)).toEqual([4, 0, 4, 0, 4]);
    expect(nonesAlongLength).toEqual([0.25, 0.75]);
    expect(nonesAlongWidth).toEqual([]);
  });

  it('have words on the edge they change along', () => {
    expect(edgeWords(0)).toEqual([]);
    expect(edgeWords(1)).toEqual([
      { at: 0, strong: true },
      { at: 0.5, strong: false },
      { at: 1, strong: true },
    ]);
  });
});

describe('rows of tails', () => {
  const band = (before: number | null, after: number | null): BandEstimate => ({
    centreHz: 500,
    before: { eyringS: before, sabineS: before },
    after: { eyringS: after, sabineS: after },
  });

  it('share one axis from 0 that holds the longest', () => {
    const { rows, ticks } = tailRowsLayout([band(1.62, 0.66), band(0.42, 0.25)], 340);
    expect(ticks.map(({ text }) => text)).toEqual(['0', '0.4', '0.8', '1.2', '1.6 s']);
    expect(rows[0].beforeX).toBeLessThanOrEqual(332);
    expect(rows[0].arrow).toMatchObject({ toX: rows[0].afterX! + 9 });
    expect(rows[1].beforeX! - 8).toBeCloseTo(((rows[0].beforeX! - 8) * 0.42) / 1.62, 6);
  });

  it('draw no arrow where ring and disc are near, and nothing where nothing is known', () => {
    const { rows } = tailRowsLayout([band(1, 0.99), band(null, 1)], 340);
    expect(rows[0].arrow).toBeNull();
    expect(rows[1]).toMatchObject({ beforeX: null, arrow: null });
  });
});

describe('what stands on the walls', () => {
  const surface = (materialId: string, areaM2: number) => ({
    place: 'left' as const,
    areaM2,
    materialId,
    guessed: false,
  });
  const plan = { areaM2: 8, treatmentId: 'wool', thicknessCm: 10, spot: 'long-walls' as const };

  it('is as long as its area from floor to ceiling, in the middle of its wall', () => {
    const stretches = plannedOnWalls(plan, size);
    expect(stretches.map(({ wall }) => wall)).toEqual(['back', 'front']);
    for (const { fromM, toM } of stretches) {
      expect(toM - fromM).toBeCloseTo(4 / 2.4, 9);
      expect((fromM + toM) / 2).toBeCloseTo(2.6, 9);
    }
    expect(plannedOnWalls({ ...plan, spot: 'floor' }, size)).toEqual([]);
    const flat = plannedFlat({ ...plan, spot: 'floor' }, size)!;
    expect(flat.lengthM * flat.widthM).toBeCloseTo(8, 9);
    expect(plannedFlat(plan, size)).toBeNull();
  });

  it('is soft, a door, or nothing to draw', () => {
    const surfaces = [surface('heavy-curtain', 4.8), surface('timber-door', 2.1), surface('plaster', 1)];
    expect(softOnWalls(surfaces, size)).toMatchObject([{ wall: 'left' }]);
    const [door] = doorsInWalls(surfaces, size);
    expect(door.toM - door.fromM).toBeCloseTo(1, 9);
  });

  it('lies on the wall in the picture, and waves into the room', () => {
    const layout = planLayout({ kind: 'box', ...size }, 526)!;
    const { from, to, inward } = wallLine({ wall: 'right', fromM: 0, toM: 3.1 }, size, layout);
    expect(from.x).toBeCloseTo(layout.at({ xM: 5.2, yM: 0 }).x, 9);
    expect(from.y - to.y).toBeCloseTo(3.1 * layout.pxPerM, 9);
    expect(inward).toEqual({ x: -1, y: 0 });
    const numbers = wavePath(from, to, inward)
      .match(/[\d.]+/g)!
      .map(Number);
    expect(numbers.every(Number.isFinite)).toBe(true);
    expect(Math.max(...numbers.filter((_, i) => i % 2 === 0))).toBeLessThan(from.x);
  });
});
