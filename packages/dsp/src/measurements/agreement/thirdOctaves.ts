export interface ThirdOctave {
  /** Exact midband frequency. */
  readonly centreHz: number;
  /** What the band is called. */
  readonly nominal: string;
  readonly lowHz: number;
  readonly highHz: number;
}

/** Octave ratio of base 10 (IEC 61260-1:2014, equation 1). */
const OCTAVE_RATIO = 10 ** 0.3;
const LOWEST_BAND = -16;
const NOMINALS =
  '25 31.5 40 50 63 80 100 125 160 200 250 315 400 500 630 800 1k 1.25k 1.6k 2k 2.5k 3.15k 4k 5k 6.3k 8k 10k'.split(
    ' ',
  );

/** The third-octave bands from 25 Hz to 10 kHz: midband 1000·G^(x/3), edges a sixth of an octave to each side. */
export const thirdOctaves: readonly ThirdOctave[] = NOMINALS.map((nominal, index) => {
  const centreHz = 1000 * OCTAVE_RATIO ** ((LOWEST_BAND + index) / 3);
  return {
    centreHz,
    nominal,
    lowHz: centreHz * OCTAVE_RATIO ** (-1 / 6),
    highHz: centreHz * OCTAVE_RATIO ** (1 / 6),
  };
});

export type ZoneName = 'deep' | 'thump' | 'body' | 'knock' | 'click';

export interface Zone {
  readonly name: ZoneName;
  readonly lowHz: number;
  readonly highHz: number;
}

/** The zones of "where it helps", each made of whole third-octaves: deep is 25, 31.5, 40 and 50 Hz. */
export const zones: readonly Zone[] = (
  [
    ['deep', '25', '50'],
    ['thump', '63', '125'],
    ['body', '160', '500'],
    ['knock', '630', '2k'],
    ['click', '2.5k', '10k'],
  ] as const
).map(([name, from, to]) => ({ name, lowHz: band(from).lowHz, highHz: band(to).highHz }));

function band(nominal: string): ThirdOctave {
  return thirdOctaves[NOMINALS.indexOf(nominal)];
}
