import { emptySetup } from '@thudline/contracts';
import { kickMicrophoneAt, overheadAt, setupDistances } from './setupGeometry';

const kick = { ...emptySetup.kick, insideCm: 8, offCentreCm: 4, heightCm: 28 };
const overhead = { ...emptySetup.overhead, aboveSnareCm: 90, towardKickCm: 9, awayFromHatCm: 8 };

describe('where the microphones stand', () => {
  it('is told from where the beater strikes', () => {
    expect(kickMicrophoneAt(kick)).toEqual({ frontCm: 33, rightCm: 4, upCm: 28 });
    expect(overheadAt(overhead)).toEqual({ frontCm: -19, rightCm: -20, upCm: 156 });
  });

  it('is unknown in the direction of an empty field', () => {
    expect(kickMicrophoneAt({ ...kick, offCentreCm: null })).toEqual({
      frontCm: 33,
      rightCm: null,
      upCm: 28,
    });
    expect(overheadAt(emptySetup.overhead)).toEqual({ frontCm: null, rightCm: null, upCm: null });
  });
});

describe('the distances', () => {
  it('follow from the places by Pythagoras', () => {
    const told = setupDistances({ kick, overhead });
    // 33² + 4² + 2² = 1109; 19² + 20² + 126² = 16,637.
    expect(told.beaterToKickCm).toBeCloseTo(Math.sqrt(1109), 9);
    expect(told.beaterToOverheadCm).toBeCloseTo(Math.sqrt(16_637), 9);
    expect(told.differenceCm).toBeCloseTo(95.68, 2);
  });

  it('need every field of their microphone', () => {
    expect(setupDistances({ kick: { ...kick, heightCm: null }, overhead })).toMatchObject({
      beaterToKickCm: null,
      differenceCm: null,
    });
    expect(setupDistances(emptySetup)).toEqual({
      beaterToKickCm: null,
      beaterToOverheadCm: null,
      differenceCm: null,
    });
  });

  it('are shorter to the overhead where the kick microphone stands far away', () => {
    const far = { ...kick, insideCm: -200 };
    expect(setupDistances({ kick: far, overhead }).differenceCm).toBeLessThan(0);
  });
});
