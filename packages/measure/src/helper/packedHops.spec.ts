import { packedHops, unpackedHops } from './packedHops';

const hops = (count: number) => ({
  low: Float64Array.from({ length: count }, (_unused, i) => i),
  peaks: Float64Array.from({ length: count }, (_unused, i) => 2 * i),
  body: new Float64Array(0),
  bright: Float64Array.of(7),
});

describe('packed hops', () => {
  it('are unpacked as they were', () => {
    expect(unpackedHops(packedHops(hops(5), undefined))).toEqual(hops(5));
  });

  it('take the room of an earlier block where it is large enough', () => {
    const { buffer } = packedHops(hops(9), undefined);
    const packed = packedHops(hops(5), buffer);
    expect(packed.buffer).toBe(buffer);
    expect(unpackedHops(packed)).toEqual(hops(5));
    expect(packedHops(hops(10), buffer).buffer).not.toBe(buffer);
  });
});
