import { hairlinePath, noteTopsPx, pinRows } from './noteLayout';

describe('notes in the margin', () => {
  it('stand beside what they speak of where there is room', () => {
    const notes = [
      { anchorPx: 40, heightPx: 60 },
      { anchorPx: 200, heightPx: 60 },
    ];
    expect(noteTopsPx(notes, 12)).toEqual([40, 200]);
  });

  it('give way downwards, 12 px apart, and the next one moves up again where it can', () => {
    const notes = [
      { anchorPx: 40, heightPx: 60 },
      { anchorPx: 50, heightPx: 60 },
      { anchorPx: 300, heightPx: 60 },
    ];
    expect(noteTopsPx(notes, 12)).toEqual([40, 112, 300]);
  });

  it('never stand above the section', () => {
    expect(noteTopsPx([{ anchorPx: -20, heightPx: 10 }], 12)).toEqual([0]);
  });
});

describe('the hairline to a note', () => {
  it('is level at its place and bends where the note gave way', () => {
    expect(hairlinePath({ widthPx: 10, fallPx: 0 })).toBe('M0 0H10');
    expect(hairlinePath({ widthPx: 10, fallPx: 62 })).toBe('M0 -62H3L7 0H10');
  });
});

describe('pins on the whole take', () => {
  it('share a row while they are far enough apart', () => {
    expect(pinRows([10, 40, 100], 26).map(({ row }) => row)).toEqual([0, 0, 0]);
  });

  it('go down a row where they are not, and come up again', () => {
    expect(pinRows([10, 12, 14, 40], 26).map(({ row }) => row)).toEqual([0, 1, 2, 0]);
  });
});
