import { assertPositive, SignalError } from '../../assert';
import { ABSORPTION_BANDS_HZ, type BandAbsorption } from './absorptionTable';
import { absorptionArea, eyringS, sabineS, type AbsorbingArea } from './reverberation';

/** A floor, a ceiling, a wall or a part of one. */
export interface RoomSurface {
  readonly areaM2: number;
  readonly absorption: BandAbsorption;
}

/** Something brought in. */
export interface RoomTreatment extends RoomSurface {
  /** Place in `surfaces` of what it hides; null for what stands free and hides nothing. */
  readonly covers: number | null;
}

export interface RoomReverberationOptions {
  readonly volumeM3: number;
  readonly surfaces: readonly RoomSurface[];
  readonly treatments?: readonly RoomTreatment[];
  readonly speedOfSoundMPerS: number;
}

/** One octave; seconds per 60 dB, null where nothing absorbs. */
export interface BandReverberation {
  readonly centreHz: number;
  /** Metric sabins. */
  readonly absorptionM2: number;
  readonly sabineS: number | null;
  readonly eyringS: number | null;
}

export interface RoomReverberation {
  readonly before: readonly BandReverberation[];
  readonly after: readonly BandReverberation[];
}

/**
 * Reverberation by octave from what a room is made of, before and after what is brought in. An estimate.
 *
 * @throws {SignalError} `option` for a volume, area or absorption that can't be, a treatment of a surface there isn't, and one
 *   that covers more than is left of its surface
 * @see sabineS and eyringS for the formulas
 * @example
 * const surfaces = [{ areaM2: 85, absorption: [0.1, 0.1, 0.1, 0.1, 0.1, 0.1] }];
 * const treatments = [{ areaM2: 10, absorption: [0.3, 0.8, 1, 1, 1, 1], covers: 0 }];
 * roomReverberation({ volumeM3: 50, surfaces, treatments, speedOfSoundMPerS: 343 }).after[0].sabineS // 0.767
 */
export function roomReverberation(options: RoomReverberationOptions): RoomReverberation {
  const { volumeM3, surfaces, treatments = [], speedOfSoundMPerS } = options;
  const treated = [...uncovered(surfaces, treatments), ...treatments];
  const told = (parts: readonly RoomSurface[]): BandReverberation[] =>
    ABSORPTION_BANDS_HZ.map((centreHz, band) => {
      const areas: AbsorbingArea[] = parts.map(({ areaM2, absorption }) => ({
        areaM2,
        absorption: absorption[band],
      }));
      const room = { volumeM3, areas, speedOfSoundMPerS };
      return {
        centreHz,
        absorptionM2: absorptionArea(areas),
        sabineS: sabineS(room),
        eyringS: eyringS(room),
      };
    });
  return { before: told(surfaces), after: told(treated) };
}

/** What of the surfaces still shows; a surface wholly covered is left out. */
function uncovered(surfaces: readonly RoomSurface[], treatments: readonly RoomTreatment[]): RoomSurface[] {
  const covered = surfaces.map(() => 0);
  for (const { areaM2, covers } of treatments) {
    assertPositive(areaM2, 'areaM2');
    if (covers === null) continue;
    if (!surfaces[covers]) throw new SignalError('option', `There is no surface ${covers} to cover.`);
    covered[covers] += areaM2;
  }
  return surfaces.flatMap((surface, place) => {
    const areaM2 = surface.areaM2 - covered[place];
    if (areaM2 < 0) throw new SignalError('option', `More is put on surface ${place} than it has room for.`);
    return areaM2 > 0 ? [{ ...surface, areaM2 }] : [];
  });
}
