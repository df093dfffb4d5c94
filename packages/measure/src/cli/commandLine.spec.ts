import { defaultUserSettings } from '@thudline/contracts';
import { commandDefaults, commandLine } from './commandLine';

describe('commandLine', () => {
  it('takes two files and the usual target, aim and temperature', async () => {
    expect(await commandLine(['kick.wav', 'overhead.wav'])).toEqual({
      paths: ['kick.wav', 'overhead.wav'],
      json: false,
      help: false,
      channels: null,
      temperatureC: 20,
      target: { lowDbfs: -12, highDbfs: -6, aimDbfs: -9 },
    });
  });

  it('has the settings of a new account where none are told', () => {
    expect(defaultUserSettings).toMatchObject(commandDefaults);
  });

  it('takes every option, negative values as they stand', async () => {
    const words = 'both.wav --json --channel 0:1 --temperature-c -5.5 --target -14:-8 --aim -10'.split(' ');
    expect(await commandLine(words)).toMatchObject({
      paths: ['both.wav'],
      json: true,
      channels: { kick: 0, overhead: 1 },
      temperatureC: -5.5,
      target: { lowDbfs: -14, highDbfs: -8, aimDbfs: -10 },
    });
    expect((await commandLine(['a.wav', 'b.wav', '--aim=-7'])).target.aimDbfs).toBe(-7);
  });

  it('moves the usual aim into a target that leaves it out', async () => {
    expect((await commandLine(['a.wav', 'b.wav', '--target', '-20:-12'])).target.aimDbfs).toBe(-12);
  });

  it.each([
    [[], /^Name a kick file .*; 0 were named\.$/],
    [['a.wav', 'b.wav', 'c.wav'], /; 3 were named\.$/],
    [['a.wav', '--loud'], /--loud.*--help/],
    [['a.wav', '--channel', '1'], /such as 0:1, not "1"/],
    [['a.wav', '--temperature-c', 'warm'], /not "warm"/],
    [['a.wav', '--temperature-c', '400'], /−20 to 50/],
    [['a.wav', '--target', '-6'], /such as -12:-6/],
    [['a.wav', '--target', '-6:-12'], /lower and a higher end/],
    [['a.wav', '--aim', '-3'], /aim lies inside the target/],
    [['a.wav', '--target', '-90:-6'], /between −40 and −1/],
    [['a.wav', '--aim', 'loud'], /between −40 and −1/],
  ])('refuses %j with one sentence', async (words, sentence) => {
    await expect(commandLine(words)).rejects.toThrow(sentence);
    await expect(commandLine(words)).rejects.toThrow(/^[^\n]*\.$/);
  });
});
