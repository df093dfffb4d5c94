import { TakeFacts } from '@thudline/dsp';

export const withNoise = (facts: TakeFacts, noiseFloorDbfs: number): TakeFacts => ({
  ...facts,
  tracks: facts.tracks.map((track) => ({
    ...track,
    noiseFloorDbfs: track.role === 'overhead' ? noiseFloorDbfs : -80,
    noiseFloorReason: null,
  })),
});

export const withDecay = (facts: TakeFacts, decayS: number | null): TakeFacts => ({
  ...facts,
  room: {
    snareHits: 8,
    decayS,
    earlyS: null,
    reason: null,
    bands: [
      {
        centreHz: 500,
        t20S: decayS === null ? null : { median: decayS, iqr: 0.04 },
        earlyS: null,
        earlyToLateDb: null,
      },
    ],
  },
});
