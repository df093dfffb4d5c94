import { MeasurementStage } from './entities/measurement.entity';

/** Where each stage begins on the way from 0 to 1: reading all samples takes by far the longest. Seen on real takes. */
const stageStarts: Record<MeasurementStage, number> = {
  fetching: 0,
  levels: 0.15,
  hits: 0.75,
  arrival: 0.85,
  'adding-up': 0.93,
};
const order = Object.keys(stageStarts) as MeasurementStage[];

/** @param within - 0–1 of the stage; @returns 0–1 of the whole measurement, below 1 until it is written */
export function wholeProgress(stage: MeasurementStage, within: number): number {
  const next = order[order.indexOf(stage) + 1];
  const start = stageStarts[stage];
  const end = next ? stageStarts[next] : 0.99;
  return start + (end - start) * Math.min(1, Math.max(0, within));
}
