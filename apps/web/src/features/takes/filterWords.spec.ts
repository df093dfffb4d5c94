import { nothingWords, queryWords, widerQueries } from './filterWords';
import { everyTake } from './takesQuery';

describe('why a list is empty', () => {
  it.each([
    [{ show: 'clipped' as const }, 'Nothing you recorded has clipped.'],
    [{ show: 'hot' as const, tag: 'rug' }, 'Nothing you tagged rug is hot.'],
    [{ find: 'port' }, 'Nothing you recorded says “port”.'],
    [{ show: 'to-flip' as const, find: ' port ' }, 'Nothing you recorded that says “port” needs a flip.'],
    [{ tag: 'rug' }, 'Nothing you tagged rug is there.'],
    [{ tag: 'rug', setup: 'x' }, 'Nothing you tagged rug with that setup is there.'],
    [{ show: 'hum' as const }, 'Nothing you recorded hums.'],
    [{ show: 'dropouts' as const, tag: 'rug' }, 'Nothing you tagged rug seems to drop out.'],
  ])('%j', (change, words) => {
    expect(nothingWords({ ...everyTake, ...change })).toBe(words);
  });
});

describe('wider sentences', () => {
  it('each ask one thing less', () => {
    const query = { show: 'clipped', tag: 'rug', setup: null, find: 'port', order: 'oldest' } as const;
    expect(widerQueries(query).map(queryWords)).toEqual([
      'Every take tagged rug that says “port”',
      'Clipped takes that say “port”',
      'Clipped takes tagged rug',
    ]);
    expect(queryWords({ ...everyTake, show: 'hum', tag: 'rug' })).toBe('Takes that hum tagged rug');
  });

  it('ask of any setup, too', () => {
    const query = { ...everyTake, show: 'clipped' as const, setup: 'x' };
    expect(widerQueries(query).map(queryWords)).toEqual(['Every take with that setup', 'Clipped takes']);
  });

  it('are not there where only every take is wider', () => {
    expect(widerQueries({ ...everyTake, show: 'clipped' })).toEqual([]);
    expect(widerQueries(everyTake)).toEqual([]);
  });
});
