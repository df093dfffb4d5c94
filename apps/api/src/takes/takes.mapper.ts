import { TakeResponse } from '@thudline/contracts';
import { TakeRights } from '../access/take-rights';
import { Measurement } from '../measuring/entities/measurement.entity';
import { measurementResponseOf } from '../measuring/measurement.mapper';
import { SheetVersions } from '../measuring/sheet-versions.service';
import { Setup } from '../setups/entities/setup.entity';
import { TakeFile } from './entities/take-file.entity';
import { TakeTrack } from './entities/take-track.entity';
import { Take } from './entities/take.entity';

export interface WholeTake {
  /** With its owner. */
  take: Take;
  files: TakeFile[];
  tracks: TakeTrack[];
  measurement: Measurement;
  versions: SheetVersions;
  /** Take before and take after, where they are there. */
  follows: Take | null;
  followedBy: Take | null;
  setup: Setup | null;
  rights: TakeRights;
}

export function takeResponseOf(whole: WholeTake): TakeResponse {
  const { take, files, tracks, measurement, rights } = whole;
  const { own, change, listen, download } = rights;
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
    ...(own ? ownersPart(whole) : othersPart),
    rights: { change, listen, download },
    player: take.owner.unwrap().name,
  };
}

type OwnersPart = Pick<
  TakeResponse,
  'sheetVersions' | 'renewal' | 'tickedActions' | 'tags' | 'follows' | 'followedBy' | 'room' | 'setup'
>;

function ownersPart({ take, versions, follows, followedBy, setup }: WholeTake): OwnersPart {
  const room = take.room?.unwrap();
  return {
    ...versions,
    tickedActions: take.tickedActions,
    tags: take.tags,
    follows: follows && { id: follows.id, number: follows.number, title: follows.title },
    room: room ? { id: room.id, name: room.name } : null,
    followedBy: followedBy && { id: followedBy.id, number: followedBy.number },
    setup: setup && { id: setup.id, name: setup.name },
  };
}

/** What whoever only reads a sheet isn't told: it leads to takes, or sheets, that were not shown to them. */
const othersPart: OwnersPart = {
  sheetVersions: [],
  renewal: 'none',
  tickedActions: [],
  tags: [],
  follows: null,
  followedBy: null,
  setup: null,
  room: null,
};

function takeFileResponseOf(file: TakeFile): TakeResponse['files'][number] {
  const { id, name, bytes, sha256, encoding, sampleRateHz, channels, frames } = file;
  const durationS = frames / sampleRateHz;
  const broadcast = file.broadcast ?? null;
  return { id, name, bytes, sha256, encoding, sampleRateHz, channels, durationS, broadcast };
}
