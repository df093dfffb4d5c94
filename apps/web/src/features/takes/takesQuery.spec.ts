import { everyTake, takesAddress, takesQuery } from './takesQuery';

const read = (search: string) => takesQuery(new URLSearchParams(search));

describe('the filter sentence in the address', () => {
  it('is empty for every take, newest first', () => {
    expect(takesAddress(everyTake)).toBe('/takes');
    expect(read('')).toEqual(everyTake);
  });

  it('comes back from the address as it went in', () => {
    const query = {
      show: 'clipped',
      order: 'hardest-kick',
      tag: 'rug & blankets',
      setup: '01890000-0000-7000-8000-000000000051',
      find: 'port, again',
    } as const;
    expect(read(takesAddress(query).split('?')[1])).toEqual(query);
  });

  it('reads what it does not know as if it were not there', () => {
    expect(read('show=loudest&order=random&tag=&setup=high&after=c1')).toEqual(everyTake);
  });

  it('keeps no spaces around the words looked for', () => {
    expect(takesAddress({ ...everyTake, find: '  ' })).toBe('/takes');
    expect(takesAddress({ ...everyTake, find: ' port ' })).toBe('/takes?find=port');
  });
});
