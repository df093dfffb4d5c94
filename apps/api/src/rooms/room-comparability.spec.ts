import { emptySetup, SetupFields } from '@thudline/contracts';
import { betweenCaveat, comparability } from './room-comparability';

const setup: SetupFields = {
  ...emptySetup,
  kick: { ...emptySetup.kick, insideCm: 0 },
  overhead: { ...emptySetup.overhead, aboveSnareCm: 112, which: 'a small condenser' },
  kickPreamp: { ...emptySetup.kickPreamp, gainDb: 30 },
  overheadPreamp: { ...emptySetup.overheadPreamp, gainDb: 41 },
};
const told = (before: (SetupFields | null)[], after: (SetupFields | null)[]) =>
  comparability({ before, after, lengthUnit: 'metre' });

describe('takes around a change', () => {
  it('compare in everything where their setups are alike', () => {
    expect(told([setup], [setup, setup])).toEqual({
      because: null,
      gainKnownSame: true,
      gainChanged: false,
      caveats: [],
    });
  });

  it.each<[string, Partial<SetupFields>, string]>([
    [
      'a microphone moved',
      { kick: { ...setup.kick, insideCm: 5 } },
      'the kick microphone moved as well, from 0 cm to 5 cm inside',
    ],
    [
      'another one was used',
      { overhead: { ...setup.overhead, which: 'a ribbon' } },
      'it is another overhead microphone as well: a small condenser before, a ribbon after',
    ],
    [
      'a filter was switched',
      { overheadPreamp: { ...setup.overheadPreamp, lowCut: true } },
      'the overhead low cut was switched as well',
    ],
  ])('don’t compare where %s', (_, changed, because) => {
    expect(told([setup], [setup, { ...setup, ...changed }]).because).toBe(because);
  });

  it('compare without noise and low end where a preamp was turned', () => {
    const turned = { ...setup, overheadPreamp: { ...setup.overheadPreamp, gainDb: 44 } };
    expect(told([setup], [turned])).toEqual({
      because: null,
      gainKnownSame: false,
      gainChanged: true,
      caveats: [
        'The overhead preamp changed as well, from 41 dB to 44 dB: noise and low end aren’t compared.',
      ],
    });
  });

  it('say where nobody knows how the microphones stood, and what was noted of the kit', () => {
    const { caveats, gainKnownSame, because } = told(
      [null, { ...setup, rest: 'felt' }],
      [{ ...setup, rest: 'wood' }],
    );
    expect({ gainKnownSame, because }).toEqual({ gainKnownSame: false, because: null });
    expect(caveats).toEqual([
      'Not every take has its setup written down: nobody knows whether the microphones stood alike.',
      'Noted of the setups besides: “felt” before, “wood” after.',
    ]);
  });

  it('name the other changes that lie between them', () => {
    expect(betweenCaveat([])).toEqual([]);
    expect(betweenCaveat([3])).toEqual(['Change 3 lies between these takes as well.']);
    expect(betweenCaveat([3, 4])).toEqual(['Changes 3 and 4 lie between these takes as well.']);
  });
});
