import { TryOutListItem, TryOutPlaceResponse, TryOutResponse } from '@thudline/contracts';
import { Measurement } from '../measuring/entities/measurement.entity';
import { measurementResponseOf } from '../measuring/measurement.mapper';
import { Take } from '../takes/entities/take.entity';
import { TryOutPlace } from './entities/try-out-place.entity';
import { TryOut } from './entities/try-out.entity';

/** A place and what became of it. */
export interface FilledPlace {
  place: TryOutPlace;
  take: Take | null;
  measurement: Measurement | null;
}

function placeResponseOf({ place, take, measurement }: FilledPlace): TryOutPlaceResponse {
  const { id, uploadKey, fileNames, position, label } = place;
  return {
    id,
    uploadKey,
    take: take &&
      measurement && {
        id: take.id,
        number: take.number,
        title: take.title,
        recordedAt: take.recordedAt.toISOString(),
        measurement: measurementResponseOf(measurement),
        hasReport: Boolean(take.currentReportId),
      },
    fileNames,
    position: position ?? null,
    label,
  };
}

function headOf(tryOut: TryOut, filled: FilledPlace[]) {
  const { id, subject, differs, unit } = tryOut;
  const known = (placeId: string | null | undefined) =>
    filled.some(({ place }) => place.id === placeId) ? (placeId ?? null) : null;
  return {
    id,
    createdAt: tryOut.createdAt.toISOString(),
    subject,
    differs,
    unit,
    winnerPlaceId: known(tryOut.winnerPlaceId),
    currentPlaceId: known(tryOut.currentPlaceId),
  };
}

/** @param tryOut - with its owner and the setup its winner was made to */
export function tryOutResponseOf(tryOut: TryOut, filled: FilledPlace[]): TryOutResponse {
  return {
    ...headOf(tryOut, filled),
    reason: tryOut.reason,
    winnerSetup: winnerSetupOf(tryOut),
    places: filled.map(placeResponseOf),
  };
}

function winnerSetupOf({ winnerSetup, owner }: TryOut): TryOutResponse['winnerSetup'] {
  if (!winnerSetup) return null;
  const { id, name, copiedFrom } = winnerSetup.unwrap();
  const source = copiedFrom?.unwrap();
  return {
    id,
    name,
    copiedFrom: source ? { id: source.id, name: source.name } : null,
    isCurrent: owner.unwrap().currentSetupId === id,
  };
}

export function tryOutListItemOf(tryOut: TryOut, filled: FilledPlace[]): TryOutListItem {
  const winner = filled.find(({ place }) => place.id === tryOut.winnerPlaceId);
  return {
    ...headOf(tryOut, filled),
    takeCount: filled.filter(({ take }) => take).length,
    winner: winner ? placeResponseOf(winner) : null,
  };
}

/** What whoever only reads it is told: nothing of uploads, neither made nor to come. */
export function readersTryOut(whole: TryOutResponse): TryOutResponse {
  const there = whole.places.filter(({ take }) => take);
  return {
    ...whole,
    winnerSetup: null,
    places: there.map((place) => ({ ...place, uploadKey: place.id, fileNames: [] })),
  };
}
