import { balanceAxisDb, balanceTicksDb } from './balanceLineLayout';

describe('the line of drums and cymbals', () => {
  it('has ends that stay, and goes beyond them for what lies outside', () => {
    expect(balanceAxisDb(-4)).toEqual({ min: -12, max: 6 });
    expect(balanceAxisDb(-13.8)).toEqual({ min: -18, max: 6 });
    expect(balanceAxisDb(7.1)).toEqual({ min: -12, max: 12 });
  });

  it('has a tick at the drums whatever its width', () => {
    expect(balanceTicksDb({ min: -12, max: 6 }, 704)).toEqual([-12, -6, 0, 6]);
    expect(balanceTicksDb({ min: -42, max: 6 }, 320)).toEqual([-36, -24, -12, 0]);
  });
});
