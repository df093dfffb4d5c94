import { scanCode } from './scanCode';

describe('the code to scan', () => {
  // ISO/IEC 18004: version v has 17 + 4v modules a side; 53 bytes at level M need version 4.
  it('has the size of its version and a quiet zone of four modules on every side', () => {
    const { sizeModules, path } = scanCode(`https://example.org/phone/${'a'.repeat(27)}`);
    expect(sizeModules).toBe(17 + 4 * 4 + 8);
    const columns = [...path.matchAll(/M(\d+) (\d+)/g)].map(([, x, y]) => [Number(x), Number(y)]).flat();
    expect(Math.min(...columns)).toBe(4);
    expect(Math.max(...columns)).toBe(sizeModules - 5);
  });

  it('draws the three finder patterns', () => {
    const { sizeModules, path } = scanCode('https://example.org/phone/x');
    const far = sizeModules - 4 - 7;
    for (const corner of [`M4 4h`, `M${far} 4h`, `M4 ${far}h`]) expect(path).toContain(corner);
  });

  it('differs for different addresses', () => {
    expect(scanCode('https://example.org/a').path).not.toBe(scanCode('https://example.org/b').path);
  });
});
