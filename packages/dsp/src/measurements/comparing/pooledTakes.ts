import type { BalanceFacts, RoomBandFacts, RoomFacts, TakeFacts, TrackFacts } from '../../facts';
import { SignalError } from '../../assert';
import { median } from '../statistics';

/**
 * Several takes of one side of a change as one, for comparing: their hits together, so that more of them tell.
 *
 * Figures of a whole take (levels, noise) are the middle of the takes'; what isn't compared is the last take's.
 *
 * @param takes - at least one, of the same microphones
 * @throws {SignalError} `option` without a take
 * @example
 * pooledTakes([facts, facts]).hits.length // 16
 */
export function pooledTakes(takes: readonly TakeFacts[]): TakeFacts {
  const last = takes.at(-1);
  if (!last) throw new SignalError('option', 'There is no take to pool.');
  if (takes.length === 1) return last;
  return {
    ...last,
    hits: takes.flatMap((take) => take.hits),
    tracks: last.tracks.map((track, place) => pooledTrack(track, takes, place)),
    balance: pooledBalance(takes) ?? last.balance,
    room: pooledRoom(takes) ?? last.room,
  };
}

function pooledTrack(track: TrackFacts, takes: readonly TakeFacts[], place: number): TrackFacts {
  const middle = (figure: (one: TrackFacts) => number | null): number | null => {
    const known = takes.flatMap(({ tracks }) => (tracks[place] ? (figure(tracks[place]) ?? []) : []));
    return median(known);
  };
  return {
    ...track,
    noiseFloorDbfs: middle((one) => one.noiseFloorDbfs),
    loudestHitDbfs: middle((one) => one.loudestHitDbfs),
  };
}

function pooledBalance(takes: readonly TakeFacts[]): BalanceFacts | null {
  const last = takes.at(-1)?.balance;
  const perHits = takes.flatMap(({ balance }) => balance?.perHit ?? []);
  if (!last || perHits.length === 0) return null;
  return {
    ...last,
    perHit: {
      drumsLufs: perHits.flatMap((hits) => hits.drumsLufs),
      cymbalsLufs: perHits.flatMap((hits) => hits.cymbalsLufs),
    },
  };
}

function pooledRoom(takes: readonly TakeFacts[]): RoomFacts | null {
  const last = takes.at(-1)?.room;
  if (!last) return null;
  const rooms = takes.flatMap(({ room }) => room ?? []);
  const known = rooms.flatMap(({ brightnessPerHitDb }) => brightnessPerHitDb ?? []);
  return {
    ...last,
    snareHits: rooms.reduce((sum, { snareHits }) => sum + snareHits, 0),
    bands: last.bands.map((band) => pooledBand(band, rooms)),
    ...(last.brightnessPerHitDb ? { brightnessPerHitDb: known } : {}),
  };
}

function pooledBand(band: RoomBandFacts, rooms: readonly RoomFacts[]): RoomBandFacts {
  if (!band.perHit) return band;
  const alike = rooms.flatMap(({ bands }) => bands.filter(({ centreHz }) => centreHz === band.centreHz));
  const perHits = alike.flatMap(({ perHit }) => perHit ?? []);
  return {
    ...band,
    perHit: {
      t20S: perHits.flatMap((hits) => hits.t20S),
      earlyS: perHits.flatMap((hits) => hits.earlyS),
      earlyToLateDb: perHits.flatMap((hits) => hits.earlyToLateDb),
    },
  };
}
