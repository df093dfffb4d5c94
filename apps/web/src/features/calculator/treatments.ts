import { absorptionTable, type Material } from '@thudline/dsp';

/** Something that can be brought into a room, in one or more thicknesses. */
export interface Treatment {
  readonly id: string;
  readonly words: string;
  /** As a heading says it: "with the wool". */
  readonly short: string;
  /** Thickness null: the table has only one, and doesn't say which. */
  readonly layers: readonly { thicknessCm: number | null; materialId: string }[];
}

/** Densities as the table prints them. */
export const treatments: readonly Treatment[] = [
  {
    id: 'wool',
    words: 'mineral wool, 48 kg/m³',
    short: 'wool',
    layers: [
      { thicknessCm: 5, materialId: 'fibre-50-mm' },
      { thicknessCm: 10, materialId: 'fibre-100-mm' },
    ],
  },
  {
    id: 'light-wool',
    words: 'light mineral wool, 24 kg/m³',
    short: 'wool',
    layers: [
      { thicknessCm: 5, materialId: 'light-fibre-50-mm' },
      { thicknessCm: 10, materialId: 'light-fibre-100-mm' },
    ],
  },
  {
    id: 'curtain',
    words: 'heavy curtain, draped',
    short: 'curtain',
    layers: [{ thicknessCm: null, materialId: 'heavy-curtain' }],
  },
  {
    id: 'carpet',
    words: 'heavy carpet on felt',
    short: 'carpet',
    layers: [{ thicknessCm: null, materialId: 'carpet-on-felt' }],
  },
  {
    id: 'carpet-bare',
    words: 'heavy carpet, laid bare',
    short: 'carpet',
    layers: [{ thicknessCm: null, materialId: 'carpet-on-concrete' }],
  },
];

export function getTreatment(id: string): Treatment {
  const found = treatments.find((treatment) => treatment.id === id);
  if (!found) throw new Error(`There is no treatment ${id}.`);
  return found;
}

export function getMaterial(id: string): Material {
  const found = absorptionTable.find((material) => material.id === id);
  if (!found) throw new Error(`There is no material ${id}.`);
  return found;
}
