import { MeasurementResponse } from '@thudline/contracts';
import { Measurement } from './entities/measurement.entity';

export function measurementResponseOf(measurement: Measurement): MeasurementResponse {
  const { state, stage, progress, attempt, reason } = measurement;
  return { state, stage: stage ?? null, progress, attempt, reason: reason ?? null };
}
