import { fileProgress, progressed, uploadStarted, type UploadProgress } from './uploadProgress';

const at = (atMs: number, loadedBytes: number, totalBytes = 15_000_000) => ({
  atMs,
  loadedBytes,
  totalBytes,
});
const walk = (...reports: ReturnType<typeof at>[]) => reports.reduce(progressed, uploadStarted(0));

describe('the speed of an upload', () => {
  it('is not judged by the first packets', () => {
    expect(walk(at(100, 900_000)).rateBytesPerS).toBeNull();
  });
  it('begins as the mean so far', () => {
    expect(walk(at(100, 100_000), at(1000, 500_000)).rateBytesPerS).toBeCloseTo(500_000);
  });
  it('stays what it is while it is steady', () => {
    const reports = Array.from({ length: 20 }, (_, i) => at((i + 1) * 1000, (i + 1) * 400_000));
    expect(walk(...reports).rateBytesPerS).toBeCloseTo(400_000);
  });
  it('does not jump with one slow moment, and follows a lasting change', () => {
    const steady = walk(at(1000, 400_000), at(2000, 800_000));
    const slowMoment = progressed(steady, at(2500, 800_000));
    expect(slowMoment.rateBytesPerS).toBeGreaterThan(300_000);
    let slower = steady;
    for (let s = 3; s < 30; s++) slower = progressed(slower, at(s * 1000, 800_000 + (s - 2) * 100_000));
    // 27 s are almost seven smoothing times of 4 s: what is left of the old speed is 0.1 %.
    expect(slower.rateBytesPerS).toBeCloseTo(100_000, -3);
  });
  it('survives two reports at one moment', () => {
    expect(walk(at(1000, 400_000), at(1000, 410_000)).rateBytesPerS).toBeCloseTo(400_000);
  });
});

describe('what has been sent of each file', () => {
  const half: UploadProgress = {
    startedAtMs: 0,
    atMs: 1000,
    loadedBytes: 9_001_000,
    totalBytes: 15_001_000,
    rateBytesPerS: 100_000,
  };
  it('fills them in their order, after the text in front of them', () => {
    expect(fileProgress([7_500_000, 7_500_000], half)).toEqual([
      { sentBytes: 7_500_000, sizeBytes: 7_500_000, secondsLeft: 0 },
      { sentBytes: 1_500_000, sizeBytes: 7_500_000, secondsLeft: 60 },
    ]);
  });
  it('counts the wait for a later file with those before it', () => {
    const early = { ...half, loadedBytes: 3_501_000 };
    expect(fileProgress([7_500_000, 7_500_000], early).map((file) => file.secondsLeft)).toEqual([40, 115]);
  });
  it('is nothing before the browser tells anything', () => {
    expect(fileProgress([100, 200], uploadStarted(0))).toEqual([
      { sentBytes: 0, sizeBytes: 100, secondsLeft: null },
      { sentBytes: 0, sizeBytes: 200, secondsLeft: null },
    ]);
  });
});
