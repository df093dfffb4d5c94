import type { ArrivalFacts } from '../facts';
import { measureTake } from '../measureTake';
import { arrayTrack } from './arrayTrack';
import type { ArrivalCase } from './arrivalCases';

export interface ArrivalRow {
  readonly name: string;
  readonly isHidden: boolean;
  readonly arrival: ArrivalFacts;
  /** Null where nothing is told. */
  readonly errorMs: number | null;
}

/** Makes and measures one case. */
export async function arrivalRow({ name, trueMs, isHidden, make }: ArrivalCase): Promise<ArrivalRow> {
  const { kick, overhead, sampleRateHz } = make();
  const { facts } = await measureTake({
    tracks: [
      { role: 'kick', source: arrayTrack(kick, sampleRateHz) },
      { role: 'overhead', source: arrayTrack(overhead, sampleRateHz) },
    ],
  });
  const { arrival } = facts.pairs[0];
  return { name, isHidden, arrival, errorMs: arrival.arrivalMs === null ? null : arrival.arrivalMs - trueMs };
}
