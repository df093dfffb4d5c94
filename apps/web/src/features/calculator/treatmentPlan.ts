import type { KnownRoom } from './knownRoom';
import { roomFor, spotsOf, type Spot } from './spots';
import { getTreatment, treatments, type Treatment } from './treatments';

/** What is tried out on paper: so much of this, so thick, there. */
export interface TreatmentPlan {
  areaM2: number;
  treatmentId: string;
  thicknessCm: number | null;
  spot: Spot;
}

const ideas: readonly TreatmentPlan[] = [
  { areaM2: 8, treatmentId: 'wool', thicknessCm: 10, spot: 'long-walls' },
  { areaM2: 4, treatmentId: 'light-wool', thicknessCm: 10, spot: 'ceiling' },
  { areaM2: 6, treatmentId: 'curtain', thicknessCm: null, spot: 'back' },
  { areaM2: 6, treatmentId: 'carpet', thicknessCm: null, spot: 'floor' },
  { areaM2: 4, treatmentId: 'wool', thicknessCm: 5, spot: 'short-walls' },
];

/** As a plan may be in this room: a thickness there is, a spot there is, no more than the spot holds. */
export function fitting(plan: TreatmentPlan, room: KnownRoom): TreatmentPlan {
  const thicknesses = getTreatment(plan.treatmentId).layers.map(({ thicknessCm }) => thicknessCm);
  const spotsHere = spotsOf(room);
  const spot = spotsHere.includes(plan.spot) ? plan.spot : spotsHere[0];
  return {
    ...plan,
    thicknessCm: thicknesses.includes(plan.thicknessCm)
      ? plan.thicknessCm
      : thicknesses[thicknesses.length - 1],
    spot,
    areaM2: Math.min(plan.areaM2, floorTenth(roomFor(spot, room))),
  };
}

export function layerOf({ treatmentId, thicknessCm }: TreatmentPlan): Treatment['layers'][number] {
  const { layers } = getTreatment(treatmentId);
  return layers.find((layer) => layer.thicknessCm === thicknessCm) ?? layers[0];
}

/** The next idea that isn't this plan. */
export function anotherPlan(plan: TreatmentPlan, room: KnownRoom): TreatmentPlan {
  const fittingIdeas = ideas.map((idea) => fitting(idea, room));
  const at = fittingIdeas.findIndex((idea) => sameKind(idea, plan));
  return fittingIdeas[(at + 1) % fittingIdeas.length];
}

const sameKind = (one: TreatmentPlan, other: TreatmentPlan) =>
  one.treatmentId === other.treatmentId && one.spot === other.spot && one.thicknessCm === other.thicknessCm;

const names = { area: 'm2', treatment: 'of', thickness: 'cm', spot: 'on' } as const;

/** A plan stands in the address, so that it survives a reload and can be kept. What isn't one is the first idea. */
export function planFrom(params: URLSearchParams, room: KnownRoom): TreatmentPlan {
  const areaM2 = Number(params.get(names.area));
  const treatment = treatments.find(({ id }) => id === params.get(names.treatment));
  const spot = spotsOf(room).find((each) => each === params.get(names.spot));
  const thickness = Number(params.get(names.thickness));
  return fitting(
    {
      areaM2: areaM2 > 0 && Number.isFinite(areaM2) ? areaM2 : ideas[0].areaM2,
      treatmentId: treatment?.id ?? ideas[0].treatmentId,
      thicknessCm: thickness > 0 ? thickness : treatment ? null : ideas[0].thicknessCm,
      spot: spot ?? ideas[0].spot,
    },
    room,
  );
}

export function planParams({ areaM2, treatmentId, thicknessCm, spot }: TreatmentPlan): URLSearchParams {
  const params = new URLSearchParams({ [names.area]: String(areaM2), [names.treatment]: treatmentId });
  if (thicknessCm !== null) params.set(names.thickness, String(thicknessCm));
  params.set(names.spot, spot);
  return params;
}

const floorTenth = (value: number) => Math.max(0.1, Math.floor(value * 10) / 10);
