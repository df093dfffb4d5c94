import { arcPath, placeTicks } from './lowEndLineLayout';

const x = (db: number) => 6 + ((db + 3) / 6) * 692;

describe('the low-end line', () => {
  it('keeps the labels of its ticks clear of each other and inside the picture', () => {
    const ticks = placeTicks(
      [
        { levelDb: -0.5, label: 'flipped, 1.6 ms earlier' },
        { levelDb: -0.4, label: 'not flipped, 1.6 ms earlier' },
        { levelDb: 2.9, label: 'not flipped, 0.9 ms earlier: best' },
      ],
      x,
      704,
    );
    const spans = ticks.map(({ x: at, side, label, row }) => {
      const width = label.length * 6.4;
      return { row, from: side === 'left' ? at - width : at, to: side === 'left' ? at : at + width };
    });
    for (const a of spans) {
      expect(a.from).toBeGreaterThanOrEqual(0);
      expect(a.to).toBeLessThanOrEqual(704);
      for (const b of spans)
        if (a !== b && a.row === b.row) expect(a.to <= b.from || b.to <= a.from).toBe(true);
    }
  });

  it('draws the change from the ring to the disc', () => {
    const path = arcPath(270, 424, 57);
    expect(path.startsWith('M270 47')).toBe(true);
    expect(path.endsWith('424 46')).toBe(true);
  });
});
