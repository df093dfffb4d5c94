import {
  roomReverberation,
  schroederFrequencyHz,
  type BandReverberation,
  type RoomTreatment,
} from '@thudline/dsp';
import type { KnownRoom } from './knownRoom';
import { placesOf } from './spots';
import { layerOf, type TreatmentPlan } from './treatmentPlan';
import { getMaterial } from './treatments';

/** An octave now and with what is planned; seconds per 60 dB, null where nothing absorbs. */
export interface BandEstimate {
  centreHz: number;
  before: Pick<BandReverberation, 'eyringS' | 'sabineS'>;
  after: Pick<BandReverberation, 'eyringS' | 'sabineS'>;
}

export interface TailEstimate {
  bands: BandEstimate[];
  /** Below it single modes rule; null where the room's own tail can't be told. */
  schroederHz: number | null;
}

/** The tail of a room by octave, as it is and with a plan. */
export function tailEstimate(room: KnownRoom, plan: TreatmentPlan): TailEstimate {
  const { before, after } = roomReverberation({
    volumeM3: room.volumeM3,
    speedOfSoundMPerS: room.speedOfSoundMPerS,
    surfaces: room.surfaces.map(({ areaM2, materialId }) => ({
      areaM2,
      absorption: getMaterial(materialId).absorption,
    })),
    treatments: covering(room, plan),
  });
  const bands = before.map((band, i) => ({ centreHz: band.centreHz, before: band, after: after[i] }));
  const reverberationS = middleTail(before);
  return {
    bands,
    schroederHz:
      reverberationS === null ? null : schroederFrequencyHz({ reverberationS, volumeM3: room.volumeM3 }),
  };
}

/** Mean of the octaves at 500 Hz and 1 kHz, as rooms are usually named by one figure. */
function middleTail(bands: readonly BandReverberation[]): number | null {
  const tails = bands
    .filter(({ centreHz }) => centreHz === 500 || centreHz === 1000)
    .flatMap(({ eyringS }) => (eyringS === null || eyringS === 0 ? [] : [eyringS]));
  return tails.length === 2 ? (tails[0] + tails[1]) / 2 : null;
}

/** The plan's area shared evenly over the sides of its spot, and on each over the parts that are there, the largest first. */
function covering(room: KnownRoom, plan: TreatmentPlan): RoomTreatment[] {
  const { areaM2, spot } = plan;
  const { absorption } = getMaterial(layerOf(plan).materialId);
  const sides = room.size ? placesOf(spot, room.size) : [null];
  return sides.flatMap((side) => {
    let leftM2 = areaM2 / sides.length;
    const parts = room.surfaces
      .map((surface, covers) => ({ ...surface, covers }))
      .filter(({ place }) => place === side)
      .sort((one, other) => other.areaM2 - one.areaM2);
    return parts.flatMap(({ covers, areaM2: partM2 }) => {
      const coveredM2 = Math.min(partM2, leftM2);
      leftM2 -= coveredM2;
      return coveredM2 > 0 ? [{ areaM2: coveredM2, absorption, covers }] : [];
    });
  });
}
