import { emptySetup, SetupFields } from '@thudline/contracts';
import { gainsAlike, sameGroups, setupRows, switchedBetween } from './setup-rows';

const preamp = { ...emptySetup.kickPreamp, gainDb: 38 };
const setup: SetupFields = {
  ...emptySetup,
  name: 'usual',
  kick: { ...emptySetup.kick, insideCm: 8 },
  kickPreamp: preamp,
  overheadPreamp: { ...preamp, gainDb: 42 },
};
const flippedKickDown: SetupFields = {
  ...setup,
  kickPreamp: { ...preamp, gainDb: 31.5 },
  overheadPreamp: { ...setup.overheadPreamp, polarity: true },
};

describe('two setups side by side', () => {
  it('tell what differs as it was written down', () => {
    expect(setupRows(setup, flippedKickDown, 'metre')).toEqual([
      { what: 'kick preamp', before: '38 dB', after: '31.5 dB' },
      { what: 'overhead polarity', before: 'not pressed', after: 'pressed' },
    ]);
    expect(sameGroups(setup, flippedKickDown)).toEqual(['positions']);
  });

  it('tell distances in the reader’s units, and nothing of what is not written down', () => {
    const moved = { ...setup, kick: { ...setup.kick, insideCm: -5, turnedDeg: 30 } };
    expect(setupRows(setup, moved, 'metre')).toEqual([
      { what: 'kick, inside', before: '8 cm', after: '−5 cm' },
      { what: 'kick, turned', before: '', after: '30°' },
    ]);
    expect(setupRows(setup, moved, 'foot')[0]).toMatchObject({ before: '3.1 in', after: '−2 in' });
  });

  it('take a switch pressed on both microphones for what it is: no flip', () => {
    const both = { ...flippedKickDown, kickPreamp: { ...flippedKickDown.kickPreamp, polarity: true } };
    expect(switchedBetween(setup, flippedKickDown)).toBe(true);
    expect(switchedBetween(setup, both)).toBe(false);
  });

  it('know whether the preamps stood alike only where both gains are written down', () => {
    expect(gainsAlike(setup, { ...setup, name: 'other' })).toBe(true);
    expect(gainsAlike(setup, flippedKickDown)).toBe(false);
    expect(gainsAlike(emptySetup, emptySetup)).toBeNull();
    const padded = { ...setup, kickPreamp: { ...preamp, pad: true } };
    expect(gainsAlike(setup, padded)).toBe(false);
  });
});
