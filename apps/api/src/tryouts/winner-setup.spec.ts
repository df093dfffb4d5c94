import { emptySetup, SetupFields, TryOutSubject } from '@thudline/contracts';
import { winnerSetupFields } from './winner-setup';

const high: SetupFields = {
  ...emptySetup,
  name: 'one overhead, high',
  overhead: { ...emptySetup.overhead, aboveSnareCm: 90, tiltedDeg: 10 },
  rest: 'felt beater',
};
const at = (subject: TryOutSubject, position: number) =>
  ({ subject, differs: '', unit: subject === 'kick-angle' ? 'degree' : 'cm', position, label: '' }) as const;
const beater = (label: string) =>
  ({ subject: 'other', differs: 'the beater', unit: 'label', position: null, label }) as const;

describe('the setup a winner makes', () => {
  it('is the one it was recorded with, with the field that was varied', () => {
    expect(winnerSetupFields(high, at('overhead-height', 112), 'metre')).toEqual({
      ...high,
      name: 'one overhead, high, overhead 112 cm',
      overhead: { ...high.overhead, aboveSnareCm: 112 },
    });
    expect(winnerSetupFields(high, at('overhead-forward', -4), 'metre').overhead.towardKickCm).toBe(-4);
    expect(winnerSetupFields(high, at('kick-depth', 8), 'metre').kick.insideCm).toBe(8);
    expect(winnerSetupFields(high, at('kick-angle', 30), 'metre').kick.turnedDeg).toBe(30);
  });

  it('holds only what was varied where nothing was written down', () => {
    expect(winnerSetupFields(null, at('overhead-height', 112), 'foot')).toEqual({
      ...emptySetup,
      name: 'overhead 44.1 in',
      overhead: { ...emptySetup.overhead, aboveSnareCm: 112 },
    });
  });

  it('says in its free text what no field is for, in place of what it said of it before', () => {
    const felt = winnerSetupFields(high, beater('wood'), 'metre');
    expect(felt).toMatchObject({ rest: 'felt beater; the beater: wood', overhead: high.overhead });
    const again = winnerSetupFields(felt, beater('plastic'), 'metre');
    expect(again).toMatchObject({
      name: 'one overhead, high, the beater plastic',
      rest: 'felt beater; the beater: plastic',
    });
  });

  it('keeps its name within what a setup can hold', () => {
    const long = { ...high, name: 'x'.repeat(60) };
    const { name } = winnerSetupFields(long, at('overhead-height', 112), 'metre');
    expect(name).toHaveLength(60);
    expect(name).toMatch(/^x+, overhead 112 cm$/);
  });

  it('is refused where it isn’t known how the winner stood, or where no setup can hold it', () => {
    expect(() => winnerSetupFields(high, beater(''), 'metre')).toThrow('Write down where the winner stood');
    expect(() => winnerSetupFields(high, at('overhead-height', 900), 'metre')).toThrow(
      'A distance here lies between −300 and 500 cm.',
    );
    const full = { ...high, rest: 'x'.repeat(300) };
    expect(() => winnerSetupFields(full, beater('wood'), 'metre')).toThrow('at most 300 characters');
  });
});
