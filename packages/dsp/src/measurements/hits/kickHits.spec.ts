import { createLowHops } from '../../testing/lowHops';
import { smallKit } from '../../testing/smallKit';
import { createKickCandidates, type KickCandidate } from './kickCandidates';
import { onset, onsetStretch } from './onset';
import { selectKicks } from './selectKicks';

const find = (kick: Float32Array, overhead: Float32Array, { sampleRateHz = 48000, block = 4096 } = {}) => {
  const finder = createKickCandidates(sampleRateHz);
  const hops = createLowHops(sampleRateHz);
  for (let start = 0; start < kick.length; start += block) {
    finder.push(hops.push(kick.subarray(start, start + block), overhead.subarray(start, start + block)));
  }
  return finder.result();
};
const kicksIn = (kick: Float32Array, overhead: Float32Array, options = {}) =>
  selectKicks(find(kick, overhead, options), 48000);

describe('kick candidates', () => {
  const kit = smallKit({ hats: true });

  it('are found at every kick, some milliseconds after it began', () => {
    const kicks = kicksIn(kit.kick, kit.overhead);
    expect(kicks).toHaveLength(kit.kickAt.length);
    kicks.forEach(({ atSample }, i) => {
      expect(atSample).toBeGreaterThanOrEqual(kit.kickAt[i]);
      // The band is 120 Hz wide and the level averaged over 16 ms: a rise takes up to 20 ms.
      expect(atSample).toBeLessThan(kit.kickAt[i] + 0.02 * 48000);
    });
  });

  it('do not depend on how the take is cut into blocks', () => {
    const [whole, cut] = [find(kit.kick, kit.overhead), find(kit.kick, kit.overhead, { block: 1009 })];
    const places = ({ candidates }: typeof whole) => candidates.map(({ atSample }) => atSample);
    expect(places(cut)).toEqual(places(whole));
    expect(cut.floorDb).toBe(whole.floorDb);
    // A hop that a block ends in is added up in two parts: rounding, some 1e-15 of a level.
    cut.candidates.forEach(({ kickDb, overheadDb }, i) => {
      expect(kickDb).toBeCloseTo(whole.candidates[i].kickDb, 9);
      expect(overheadDb).toBeCloseTo(whole.candidates[i].overheadDb, 9);
    });
  });

  it('do not depend on the level of either microphone', () => {
    const quieter = kicksIn(
      kit.kick.map((x) => x / 64),
      kit.overhead.map((x) => x / 1024),
    );
    expect(quieter.map((kick) => kick.atSample)).toEqual(
      kicksIn(kit.kick, kit.overhead).map((kick) => kick.atSample),
    );
  });

  it('are none in silence, in one sample and in noise without hits', () => {
    expect(kicksIn(new Float32Array(48000), new Float32Array(48000))).toEqual([]);
    expect(kicksIn(Float32Array.of(1), Float32Array.of(1))).toEqual([]);
    const { kick, overhead } = smallKit({ kicks: 0, noise: 0.01 });
    expect(kicksIn(kick, overhead).length).toBeLessThanOrEqual(1);
  });

  it('are found as sixteenths at 220 beats per minute', () => {
    const fast = smallKit({ kicks: 32, everyS: 60 / 220 / 4, bodyS: 0.04 });
    expect(kicksIn(fast.kick, fast.overhead)).toHaveLength(32);
  });
});

describe('the choice of kick hits', () => {
  const at = (atSample: number, kickDb: number, overheadDb = kickDb - 12): KickCandidate => ({
    atSample,
    kickDb,
    overheadDb,
  });
  const chosen = (candidates: KickCandidate[], floorDb = -80) =>
    selectKicks({ candidates, floorDb, overheadFloorDb: -90 }, 48000).map((kick) => kick.atSample);
  const loud = [at(0, -10), at(48000, -11), at(96000, -10), at(144000, -12)];

  it('are three kicks among the bleed of many snares', () => {
    // Seen in a synthetic room of 0.5 s: each snare rises twice, 30 dB below the kicks and told from them by its balance.
    const kicks = [-14.1, -16.1, -15.1].map((kickDb, i) => at(i * 24000, kickDb, kickDb - 11.4));
    const bleed = Array.from({ length: 7 }, (_, i) => [
      at(96000 + i * 57600, -44.8, -24.2),
      at(98500 + i * 57600, -45.1, -29.9),
    ]).flat();
    expect(
      selectKicks({ candidates: [...kicks, ...bleed], floorDb: -85, overheadFloorDb: -90 }, 48000),
    ).toEqual(kicks);
    // Two that are far louder than all others are knocks, not kicks.
    const hits = Array.from({ length: 16 }, (_, i) => at(96000 + i * 24000, -40));
    const knocks = [at(0, -10, -60), at(48000, -11, -60)];
    expect(
      selectKicks({ candidates: [...knocks, ...hits], floorDb: -85, overheadFloorDb: -90 }, 48000),
    ).toEqual(expect.arrayContaining(hits));
  });

  it('keeps what stands 15 dB over the floor', () => {
    expect(chosen(loud, -25)).toEqual([0, 96000]);
  });

  it('drops what is more than 18 dB below the median of the loudest quarter', () => {
    expect(chosen([...loud, at(192000, -28)])).toContain(192000);
    expect(chosen([...loud, at(192000, -28.5)])).not.toContain(192000);
  });

  it('is not upset by one knock on the stand', () => {
    const soft = Array.from({ length: 8 }, (_, i) => at(i * 48000, -20));
    expect(chosen([...soft, at(480000, 0)])).toHaveLength(9);
    const knock = [
      ...soft,
      ...soft.map((hit) => ({ ...hit, atSample: hit.atSample + 500000 })),
      at(1200000, 3),
    ];
    expect(chosen(knock)).toHaveLength(17);
  });

  it('leaves out knocks on the stand, which the overhead doesn’t hear, also where there are few hits', () => {
    const hits = Array.from({ length: 6 }, (_, i) => at(i * 48000, -30, -42));
    const knocks = [at(300000, -2, -88), at(350000, -3, -87)];
    expect(chosen([...hits, ...knocks])).toEqual(hits.map(({ atSample }) => atSample));
    // Where the overhead hears none of them, loudness alone remains.
    const unheard = hits.map((hit) => ({ ...hit, overheadDb: -89 }));
    expect(chosen([...unheard, ...knocks])).toEqual([300000, 350000]);
    // A hard kick is heard in both.
    expect(chosen([...hits, at(300000, -2, -20)])).toContain(300000);
  });

  it('takes a softer hit only with the balance of a kick', () => {
    expect(chosen([...loud, at(192000, -20, -32)])).toContain(192000);
    // The bleed of a low tom: as loud in the overhead as in the kick microphone.
    expect(chosen([...loud, at(192000, -20, -22)])).not.toContain(192000);
  });

  it('keeps the louder of two within 50 ms', () => {
    expect(chosen([at(0, -12), at(2399, -10), at(48000, -10)])).toEqual([2399, 48000]);
    expect(chosen([at(0, -12), at(2400, -10)])).toEqual([0, 2400]);
  });

  it('takes a much softer rise within 100 ms for the ringing of the hit before', () => {
    expect(chosen([...loud, at(144000 + 3000, -19)])).not.toContain(147000);
    expect(chosen([...loud, at(144000 + 4900, -19)])).toContain(148900);
  });
});

describe('an onset', () => {
  it('lies at the steepest rise of the click', () => {
    const sampleRateHz = 48000;
    const before = Math.ceil((onsetStretch.beforeMs / 1000) * sampleRateHz);
    const samples = new Float32Array(before + 2000);
    // A burst at 1 kHz begins 10 ms before the candidate.
    const start = before - 480;
    for (let i = start; i < samples.length; i += 1) {
      samples[i] = Math.exp((start - i) / 400) * Math.sin((2 * Math.PI * 1000 * (i - start)) / sampleRateHz);
    }
    // Half the 2 ms span: where in its first period a burst rises most depends on its shape.
    expect(Math.abs(onset(samples, { sampleRateHz, candidateAt: before }) - start)).toBeLessThan(48);
  });

  it('is the candidate itself where nothing rises', () => {
    expect(onset(new Float32Array(5000), { sampleRateHz: 48000, candidateAt: 2500 })).toBe(2500);
  });
});
