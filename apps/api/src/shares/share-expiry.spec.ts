import { expiryOf } from './share-expiry';

describe('when a link ends', () => {
  const now = new Date('2026-12-04T20:00:00Z');

  it('is so many days from now, or never', () => {
    expect(expiryOf({ expiresInDays: 7 }, now)).toEqual(new Date('2026-12-11T20:00:00Z'));
    expect(expiryOf({ expiresInDays: null }, now)).toBeNull();
  });

  it('is the moment that was named, whatever the days say', () => {
    const expiresAt = '2026-12-24T23:00:00Z';
    expect(expiryOf({ expiresInDays: 7, expiresAt }, now)).toEqual(new Date(expiresAt));
  });

  it('is neither over already nor further away than a year', () => {
    const at = (expiresAt: string) => () => expiryOf({ expiresInDays: null, expiresAt }, now);
    expect(at('2026-12-04T19:59:59Z')).toThrow('still to come');
    expect(at('2027-12-05T20:00:00Z')).toThrow('within a year');
  });
});
