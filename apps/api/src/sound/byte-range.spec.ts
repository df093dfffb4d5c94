import { byteRange } from './byte-range';

describe('byteRange', () => {
  it('asks for the whole without a range, with another unit and with several ranges', () => {
    expect(byteRange(undefined, 100)).toBeNull();
    expect(byteRange('frames=0-1', 100)).toBeNull();
    expect(byteRange('bytes=0-1,5-6', 100)).toBeNull();
    expect(byteRange('bytes=-', 100)).toBeNull();
    expect(byteRange('bytes=9-3', 100)).toBeNull();
  });

  it('makes the last byte exclusive', () => {
    expect(byteRange('bytes=10-19', 100)).toEqual({ start: 10, end: 20 });
  });

  it('ends at the end of the file', () => {
    expect(byteRange('bytes=90-', 100)).toEqual({ start: 90, end: 100 });
    expect(byteRange('bytes=90-4000', 100)).toEqual({ start: 90, end: 100 });
  });

  it('counts a suffix from the end, at most the whole file', () => {
    expect(byteRange('bytes=-10', 100)).toEqual({ start: 90, end: 100 });
    expect(byteRange('bytes=-1000', 100)).toEqual({ start: 0, end: 100 });
  });

  it('refuses a range beyond the end and an empty suffix, and tells the size', () => {
    for (const header of ['bytes=100-', 'bytes=100-200', 'bytes=-0']) {
      expect(refusalOf(header)).toMatchObject({
        code: 'range-not-satisfiable',
        headers: { 'Content-Range': 'bytes */100' },
      });
    }
  });
});

function refusalOf(header: string): unknown {
  try {
    return byteRange(header, 100);
  } catch (error) {
    return error;
  }
}
