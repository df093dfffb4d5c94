import { reportFigures as contract } from '@thudline/contracts';
import { SignalError } from '../assert';
import { measureTake } from '../measureTake';
import { arrayTrack } from '../testing/arrayTrack';
import { smallKit } from '../testing/smallKit';
import { trackFigures } from '../testing/figures';
import { gainChangeDb, levelOf, levelStatus, raisedNoiseDbfs } from './level';
import { pathDifferenceM, speedOfSoundMPerS } from './pathDifference';
import { reportFigures } from './reportFigures';
import { defaultTarget } from './reportTypes';

const clean = { runCount: 0 };
const level = (loudestHitDbfs: number | null, clipping = clean) =>
  levelOf({ loudestHitDbfs, clipping }, defaultTarget);

describe('the level of a microphone', () => {
  it('goes by the loudest hit against the target, whose ends belong to it', () => {
    expect([-5.9, -6, -9, -12, -12.1].map((peak) => level(peak))).toEqual([
      'hot',
      'on-target',
      'on-target',
      'on-target',
      'low',
    ]);
    expect(level(null)).toBeNull();
  });

  it('is clipped by any clipping, whatever the hits', () => {
    expect(level(-20, { runCount: 1 })).toBe('clipped');
    expect(level(null, { runCount: 1 })).toBe('clipped');
  });

  it('asks for the aim, and at least 9 dB down when clipped', () => {
    expect(gainChangeDb({ loudestHitDbfs: -2.5, clipping: clean }, defaultTarget)).toBe(-6.5);
    expect(gainChangeDb({ loudestHitDbfs: -21, clipping: clean }, defaultTarget)).toBe(12);
    expect(gainChangeDb({ loudestHitDbfs: -3, clipping: { runCount: 2 } }, defaultTarget)).toBe(-9);
    expect(gainChangeDb({ loudestHitDbfs: 2, clipping: { runCount: 2 } }, defaultTarget)).toBe(-11);
    expect(gainChangeDb({ loudestHitDbfs: null, clipping: clean }, defaultTarget)).toBeNull();
  });

  it('moves the noise along', () => {
    expect(raisedNoiseDbfs(trackFigures({ loudestHitDbfs: -21, noiseFloorDbfs: -70 }))).toBe(-58);
    expect(raisedNoiseDbfs(trackFigures({ noiseFloorDbfs: null }))).toBeNull();
  });

  it('is never worse than a watch when hot', () => {
    expect(levelStatus(trackFigures({ loudestHitDbfs: -0.01 }))).toBe('watch');
  });
});

describe('the path difference', () => {
  // 343.2 m/s at 20 °C (ISO 9613-1); the ideal-gas form gives the same.
  it('follows the temperature', () => {
    expect(speedOfSoundMPerS(0)).toBe(331.3);
    expect(speedOfSoundMPerS(20)).toBeCloseTo(343.2, 1);
    expect(pathDifferenceM(1.6, 20)).toBeCloseTo(0.549, 3);
    expect(pathDifferenceM(-1, 0)).toBeCloseTo(-0.3313, 9);
    expect(() => speedOfSoundMPerS(-300)).toThrow(SignalError);
  });
});

describe('report figures', () => {
  const kit = smallKit({ delayMs: 1.6, kicks: 6 });
  const facts = async () =>
    (
      await measureTake({
        tracks: [
          { role: 'overhead', source: arrayTrack(kit.overhead, kit.sampleRateHz) },
          { role: 'kick', source: arrayTrack(kit.kick, kit.sampleRateHz) },
        ],
      })
    ).facts;

  it('are the facts by role, with what follows from target and temperature', async () => {
    const take = await facts();
    const figures = reportFigures(take, { target: defaultTarget, temperatureC: 20 });
    expect(figures.kick.loudestHitDbfs).toBe(take.tracks[1].loudestHitDbfs);
    expect(figures.hits[0].kickPeakDbfs).toBe(take.hits[0].peaksDbfs[1]);
    expect(figures.arrival.pathDifferenceM).toBeCloseTo(0.549, 2);
    expect(figures.kick).not.toHaveProperty('role');
    expect(figures.findings.map((finding) => finding.topic)).toContain('adding-up');
    const lower = { lowDbfs: -30, highDbfs: -20, aimDbfs: -25 };
    expect(reportFigures(take, { target: lower, temperatureC: 20 }).kick.level).toBe('hot');
  });

  it('have the shape the API promises', async () => {
    const figures = reportFigures(await facts(), { target: defaultTarget, temperatureC: 20 });
    // Parsing drops what the contract doesn't name, so equal means nothing more and nothing less.
    expect(contract.parse(figures)).toEqual(figures);
  });

  it('have nothing to tell of what older facts lack', async () => {
    const { balance, room, ...older } = await facts();
    expect([balance, room]).not.toContain(undefined);
    expect(reportFigures(older, { target: defaultTarget, temperatureC: 20 })).toMatchObject({
      balance: null,
      room: null,
    });
  });

  it('have null for what wasn’t measured yet when the facts were stored', async () => {
    const take = await facts();
    const tracks = take.tracks.map(
      ({
        truePeakDbtp: _peak,
        integratedLufs: _loudness,
        looksFlattened: _flattened,
        hum: _hum,
        dropouts: _dropouts,
        ...track
      }) => track,
    );
    const figures = reportFigures({ ...take, tracks }, { target: defaultTarget, temperatureC: 20 });
    expect(figures.kick).toMatchObject({
      truePeakDbtp: null,
      integratedLufs: null,
      looksFlattened: null,
      hum: null,
      dropouts: null,
    });
    expect(contract.parse(figures)).toEqual(figures);
  });

  it('leave the facts as they were and hold nothing JSON can’t', async () => {
    const take = await facts();
    const before = JSON.stringify(take);
    const figures = reportFigures(take, { target: defaultTarget, temperatureC: 20 });
    expect(JSON.stringify(take)).toBe(before);
    expect(JSON.parse(JSON.stringify(figures))).toEqual(figures);
  });

  it('need a kick and an overhead', async () => {
    const take = await facts();
    const options = { target: defaultTarget, temperatureC: 20 };
    expect(() => reportFigures({ ...take, tracks: take.tracks.slice(0, 1) }, options)).toThrow(SignalError);
    expect(() => reportFigures({ ...take, pairs: [] }, options)).toThrow(SignalError);
  });
});
