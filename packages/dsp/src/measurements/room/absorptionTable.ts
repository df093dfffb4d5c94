/** Octaves that tables of absorption are given for. */
export const ABSORPTION_BANDS_HZ = [125, 250, 500, 1000, 2000, 4000] as const;

/** One value for each of `ABSORPTION_BANDS_HZ`. */
export type BandAbsorption = readonly [number, number, number, number, number, number];

export interface Material {
  readonly id: string;
  readonly name: string;
  readonly absorption: BandAbsorption;
  readonly source: string;
}

/** Read in a copy that names page and table (phonometry's test data); the book itself was not seen. */
const BIES = 'Bies, Hansen & Howard, Engineering Noise Control, 5th ed. (2017), Table 6.2, pp. 338–340';
const BARRON = 'Barron, Industrial Noise Control and Acoustics (2003), Appendix D';

/**
 * What common surfaces and treatments swallow, octave by octave.
 *
 * Tables differ by what was measured: gypsum board on studs is printed with .29 and with .10 at 125 Hz. Hence an estimate.
 */
export const absorptionTable: readonly Material[] = [
  {
    id: 'plaster',
    name: 'Plaster, brick, hard walls',
    absorption: [0.02, 0.02, 0.03, 0.03, 0.04, 0.05],
    source: BIES,
  },
  {
    id: 'concrete-floor',
    name: 'Concrete or terrazzo floor',
    absorption: [0.01, 0.01, 0.01, 0.02, 0.02, 0.02],
    source: BIES,
  },
  {
    id: 'concrete-painted',
    name: 'Poured concrete, painted',
    absorption: [0.01, 0.01, 0.01, 0.02, 0.02, 0.02],
    source: BARRON,
  },
  {
    id: 'block-painted',
    name: 'Concrete block, painted',
    absorption: [0.1, 0.05, 0.06, 0.07, 0.09, 0.08],
    source: BARRON,
  },
  {
    id: 'brick-painted',
    name: 'Brick, painted',
    absorption: [0.01, 0.01, 0.02, 0.02, 0.02, 0.03],
    source: BARRON,
  },
  {
    id: 'gypsum-on-studs',
    name: 'Gypsum board on studs',
    absorption: [0.29, 0.1, 0.05, 0.04, 0.07, 0.09],
    source: BIES,
  },
  {
    id: 'wood-floor',
    name: 'Wood floor on joists',
    absorption: [0.15, 0.11, 0.1, 0.07, 0.06, 0.07],
    source: BIES,
  },
  {
    id: 'carpet-on-felt',
    name: 'Heavy carpet on felt or foam',
    absorption: [0.08, 0.24, 0.57, 0.69, 0.71, 0.73],
    source: BIES,
  },
  {
    id: 'carpet-on-concrete',
    name: 'Heavy carpet on concrete',
    absorption: [0.02, 0.06, 0.14, 0.37, 0.6, 0.65],
    source: BIES,
  },
  {
    id: 'heavy-curtain',
    name: 'Heavy curtain, draped to half its area',
    absorption: [0.14, 0.35, 0.55, 0.72, 0.7, 0.65],
    source: BIES,
  },
  {
    id: 'fibre-50-mm',
    name: 'Mineral fibre 50 mm, 48 kg/m³',
    absorption: [0.3, 0.8, 1, 1, 1, 1],
    source: BIES,
  },
  {
    id: 'fibre-100-mm',
    name: 'Mineral fibre 100 mm, 48 kg/m³',
    absorption: [0.65, 1, 1, 1, 1, 1],
    source: BIES,
  },
  {
    id: 'light-fibre-50-mm',
    name: 'Mineral fibre 50 mm, 24 kg/m³',
    absorption: [0.27, 0.54, 0.94, 1, 1, 1],
    source: BIES,
  },
  {
    id: 'light-fibre-100-mm',
    name: 'Mineral fibre 100 mm, 24 kg/m³',
    absorption: [0.46, 1, 1, 1, 1, 1],
    source: BIES,
  },
  {
    id: 'window',
    name: 'Ordinary window',
    absorption: [0.35, 0.25, 0.18, 0.12, 0.07, 0.04],
    source: BIES,
  },
  {
    id: 'plate-glass',
    name: 'Heavy plate glass',
    absorption: [0.18, 0.06, 0.04, 0.03, 0.02, 0.02],
    source: BIES,
  },
  {
    id: 'timber-door',
    name: 'Solid timber door',
    absorption: [0.14, 0.1, 0.06, 0.08, 0.1, 0.1],
    source: BIES,
  },
  {
    id: 'open-window',
    name: 'Open window or door to outside',
    absorption: [1, 1, 1, 1, 1, 1],
    source: 'by definition of the sabin (Everest, The Master Handbook of Acoustics)',
  },
];
