import { comparison, comparisonText } from './comparison';
import { ffmpegFigures, soxFigures } from './toolFigures';

/** As ffmpeg 5.1.9 and SoX 14.4.2 print them. */
const ffmpegText = `[Parsed_ebur128_0 @ 0x55cd39bf19c0] Summary:

  Integrated loudness:
    I:         -26.4 LUFS
    Threshold: -37.8 LUFS

  Loudness range:
    LRA:         5.4 LU

  True peak:
    Peak:       -2.7 dBFS
[Parsed_astats_1 @ 0x55cd39bf1d80] Overall
[Parsed_astats_1 @ 0x55cd39bf1d80] DC offset: 0.000004
[Parsed_astats_1 @ 0x55cd39bf1d80] Peak level dB: -2.665054
[Parsed_astats_1 @ 0x55cd39bf1d80] RMS level dB: -25.029320
`;
const soxText = `DC offset   0.000004
Min level  -0.735779
Pk lev dB      -2.67
RMS lev dB    -25.03
RMS Tr dB       -inf
`;

describe('figures of other tools', () => {
  it('are read from what they print', () => {
    expect(ffmpegFigures(ffmpegText)).toEqual({
      samplePeakDbfs: -2.665054,
      rmsDbfs: -25.02932,
      dcOffset: 0.000004,
      truePeakDbtp: -2.7,
      integratedLufs: -26.4,
    });
    expect(soxFigures(soxText)).toMatchObject({ samplePeakDbfs: -2.67, rmsDbfs: -25.03, dcOffset: 0.000004 });
  });

  it('are null where they are no finite number, and where nothing passed the gate', () => {
    const silent = ffmpegText.replace(/-2\.7 dBFS|-2\.665054/g, '-inf').replace('-26.4', '-70.0');
    expect(ffmpegFigures(silent)).toMatchObject({
      samplePeakDbfs: null,
      integratedLufs: null,
    });
    expect(ffmpegFigures('')).toEqual(soxFigures(''));
  });
});

describe('the comparison', () => {
  const ours = {
    samplePeakDbfs: -2.6651,
    rmsDbfs: -25.0293,
    dcOffset: 0.0000041,
    truePeakDbtp: -2.65,
    integratedLufs: -26.41,
  };

  it('passes within what rounding leaves, and leaves out what a tool doesn’t tell', () => {
    const rows = [
      ...comparison(ours, { tool: 'ffmpeg', figures: ffmpegFigures(ffmpegText) }, 48000),
      ...comparison(ours, { tool: 'sox', figures: soxFigures(soxText) }, 48000),
    ];
    expect(rows).toHaveLength(8);
    expect(rows.every(({ isWithin }) => isWithin)).toBe(true);
  });

  it('allows for the low cut that ffmpeg leaves unscaled, which counts at low rates', () => {
    const off = { ...ours, integratedLufs: -26.6 };
    const isWithin = (rateHz: number) =>
      comparison(off, { tool: 'ffmpeg', figures: ffmpegFigures(ffmpegText) }, rateHz).at(-1)?.isWithin;
    expect([isWithin(8000), isWithin(48000)]).toEqual([true, false]);
  });

  it('fails where a figure is off', () => {
    const [peak] = comparison(
      { ...ours, samplePeakDbfs: -2.68 },
      { tool: 'sox', figures: soxFigures(soxText) },
      48000,
    );
    expect(peak.isWithin).toBe(false);
    expect(comparisonText(peak)).toMatch(/^ {2}sample peak, dBFS +sox +-2\.680 +-2\.670 +-0\.010 {2}FAIL$/);
  });
});
