import { TakeResponse } from '@thudline/contracts';
import { Measurement } from '../measuring/entities/measurement.entity';
import { measurementResponseOf } from '../measuring/measurement.mapper';
import { TakeFile } from './entities/take-file.entity';
import { TakeTrack } from './entities/take-track.entity';
import { Take } from './entities/take.entity';

export interface WholeTake {
  take: Take;
  files: TakeFile[];
  tracks: TakeTrack[];
  measurement: Measurement;
}

export function takeResponseOf({ take, files, tracks, measurement }: WholeTake): TakeResponse {
  return {
    id: take.id,
    number: take.number,
    title: take.title,
    note: take.note,
    recordedAt: take.recordedAt.toISOString(),
    createdAt: take.createdAt.toISOString(),
    files: files.map(takeFileResponseOf),
    tracks: tracks.map(({ role, file, channel }) => ({ role, fileId: file.id, channel })),
    measurement: measurementResponseOf(measurement),
    hasReport: take.currentReportId != null,
    tickedActions: take.tickedActions,
  };
}

function takeFileResponseOf(file: TakeFile): TakeResponse['files'][number] {
  const { id, name, bytes, sha256, encoding, sampleRateHz, channels, frames } = file;
  return { id, name, bytes, sha256, encoding, sampleRateHz, channels, durationS: frames / sampleRateHz };
}
