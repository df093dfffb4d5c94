import { measureTake } from '../../measureTake';
import { arrayTrack } from '../../testing/arrayTrack';
import { smallKit } from '../../testing/smallKit';
import { bandEnergies, lowEnd } from './choiceEnergy';
import { hitBalance } from './hitBalance';
import { createPairGatherer } from './pairSpectrum';

const { sin, PI } = Math;

describe('what one kick hit says', () => {
  const kit = smallKit({ delayMs: 1.6, kicks: 6 });
  const kickFigures = async (overhead = kit.overhead) => {
    const { facts, pairSpectra } = await measureTake({
      tracks: [
        { role: 'kick', source: arrayTrack(kit.kick, kit.sampleRateHz) },
        { role: 'overhead', source: arrayTrack(overhead, kit.sampleRateHz) },
      ],
    });
    return { figures: facts.hits.flatMap((hit) => hit.kickFigures ?? []), spectrum: pairSpectra[0] };
  };

  it('adds up over the hits to the pair spectrum', async () => {
    const { figures, spectrum } = await kickFigures();
    expect(figures).toHaveLength(6);
    const sum = (of: (hit: (typeof figures)[number]['lowEnergy']) => number): number =>
      figures.reduce((all, hit) => all + of(hit.lowEnergy), 0);
    if (!spectrum) throw new Error('There is no pair spectrum.');
    for (const flipped of [false, true]) {
      const s = flipped ? -1 : 1;
      const { added, powerSum } = bandEnergies(spectrum, { flipped, shiftMs: 0, gainDb: 0 }, lowEnd);
      // The pair spectrum keeps 24 bits.
      expect(sum((hit) => hit.kick + hit.overhead) / powerSum).toBeCloseTo(1, 6);
      expect(sum((hit) => hit.kick + hit.overhead + 2 * s * hit.cross) / added).toBeCloseTo(1, 6);
    }
  });

  it('tells the overhead’s 63 and 125 Hz, the same for either polarity and lower by as much as it is turned down', async () => {
    const octaves = async (gain: number) =>
      (await kickFigures(kit.overhead.map((x) => gain * x))).figures.map(
        (hit) => hit.overheadThirdOctavesDbfs,
      );
    const [plain, turned] = [await octaves(1), await octaves(-0.5)];
    plain.forEach(({ hz63, hz125 }, hit) => {
      expect((hz63 ?? NaN) - (turned[hit].hz63 ?? NaN)).toBeCloseTo(6.0206, 4);
      expect((hz125 ?? NaN) - (turned[hit].hz125 ?? NaN)).toBeCloseTo(6.0206, 4);
    });
    // The kick's tone falls to 52 Hz.
    expect(plain[0].hz63).toBeGreaterThan(plain[0].hz125 ?? NaN);
  });

  it.each([44100, 48000, 96000])(
    'reads −3.01 dBFS for a full-scale tone in its band at %i Hz',
    (sampleRateHz) => {
      const frames = 0.5 * sampleRateHz;
      const tone = (hz: number) =>
        Float32Array.from({ length: frames }, (_, n) => sin((2 * PI * hz * n) / sampleRateHz));
      const read = (hz: number) =>
        createPairGatherer({ sampleRateHz, perHit: hitBalance }).add({
          kick: tone(hz),
          overhead: tone(hz),
          onsetAt: Math.round(0.1 * sampleRateHz),
          toNext: Infinity,
        }).overheadThirdOctavesDbfs;
      // A window of 0.2 s leaks some per cent into the neighbours of a band 14 Hz wide, half of it at 29 Hz.
      expect(Math.abs((read(63.1).hz63 ?? NaN) + 3.01)).toBeLessThan(0.3);
      expect(Math.abs((read(125.9).hz125 ?? NaN) + 3.01)).toBeLessThan(0.15);
      // A fade of 5 ms lets that much through an octave off.
      expect(read(63.1).hz125).toBeLessThan(-30);
    },
  );

  it('holds nothing for a silent overhead but what the kick microphone hears', async () => {
    const { figures } = await kickFigures(new Float32Array(kit.overhead.length));
    for (const { lowEnergy, overheadThirdOctavesDbfs, attackDb } of figures) {
      expect(lowEnergy).toMatchObject({ overhead: 0, cross: 0 });
      expect(lowEnergy.kick).toBeGreaterThan(0);
      expect(overheadThirdOctavesDbfs).toEqual({ hz63: null, hz125: null });
      expect(attackDb).toBeLessThan(0);
    }
  });

  it('has no attack where the next hit comes within 200 ms', async () => {
    const fast = smallKit({ kicks: 6, everyS: 0.15 });
    const { facts } = await measureTake({
      tracks: [
        { role: 'kick', source: arrayTrack(fast.kick, fast.sampleRateHz) },
        { role: 'overhead', source: arrayTrack(fast.overhead, fast.sampleRateHz) },
      ],
    });
    const attacks = facts.hits.map((hit) => hit.kickFigures?.attackDb);
    expect(attacks).toHaveLength(6);
    expect(attacks.slice(0, 5)).toEqual(Array(5).fill(null));
    expect(attacks[5]).toBeLessThan(0);
  });
});
