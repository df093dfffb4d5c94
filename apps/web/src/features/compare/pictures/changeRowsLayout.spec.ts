import { axisSteps, changeMarks, smallBand, type DrawnFigure } from './changeRowsLayout';

const figure = (change: number | null, step = 1, interval95: DrawnFigure['interval95'] = null) => ({
  change,
  step,
  interval95,
});
const axis = { steps: 4, widthPx: 218 };

describe('rows of changes on one axis', () => {
  it('draw a step worth mentioning equally far, whatever the figure', () => {
    const lowEnd = changeMarks(figure(0.5, 0.5), axis)!;
    const decay = changeMarks(figure(0.1, 0.1), axis)!;
    expect(lowEnd.discX).toBeCloseTo(decay.discX, 6);
    expect(lowEnd.discX).toBeCloseTo(smallBand(axis).toX, 6);
  });

  it('put the ring in the middle, less to the left and more to the right', () => {
    expect(changeMarks(figure(-2), axis)).toMatchObject({ ringX: 109, discX: 59 });
    expect(changeMarks(figure(2), axis)).toMatchObject({ ringX: 109, discX: 159 });
  });

  it('leave the arrow out where ring and disc touch', () => {
    expect(changeMarks(figure(0.2), axis)?.arrow).toBeNull();
    expect(changeMarks(figure(-2), axis)?.arrow).toEqual({ fromX: 102, toX: 67 });
  });

  it('keep a change and its interval on the axis, and say that it lies beyond', () => {
    const marks = changeMarks(figure(9, 1, { low: 7, high: 11 }), axis)!;
    expect(marks.beyond).toBe(true);
    expect(marks.discX).toBe(209);
    expect(marks.interval).toEqual({ fromX: 209, toX: 209 });
  });

  it('draw nothing of what can’t be told', () => {
    expect(changeMarks(figure(null), axis)).toBeNull();
  });

  it('reach as far as the largest change, within reason', () => {
    expect(axisSteps([figure(0.2), figure(null)])).toBe(3);
    expect(axisSteps([figure(2.6, 0.5)])).toBe(5.5);
    expect(axisSteps([figure(40)])).toBe(7);
  });
});
