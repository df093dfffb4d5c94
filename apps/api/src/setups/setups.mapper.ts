import { SetupFields, SetupListItem, SetupResponse, UpdateSetupRequest } from '@thudline/contracts';
import { photoResponseOf } from '../photos/photos.mapper';
import { Setup } from './entities/setup.entity';

export type SetupUse = Pick<SetupResponse, 'takeCount' | 'takes' | 'measured'>;

/** @param setup - with its photo and the one it was copied from */
export function setupResponseOf(setup: Setup, use: SetupUse): SetupResponse {
  const { copiedFrom, photo } = setup;
  const source = copiedFrom?.unwrap();
  return {
    id: setup.id,
    createdAt: setup.createdAt.toISOString(),
    ...fieldsOf(setup),
    copiedFrom: source ? { id: source.id, name: source.name } : null,
    photo: photo ? photoResponseOf(photo.unwrap()) : null,
    ...use,
  };
}

export function setupListItemOf(
  { id, name, kick, overhead, createdAt }: Setup,
  use: { takeCount: number; lastUsedAt: Date | null } | undefined,
): SetupListItem {
  return {
    id,
    name,
    kick,
    overhead,
    createdAt: createdAt.toISOString(),
    takeCount: use?.takeCount ?? 0,
    lastUsedAt: use?.lastUsedAt?.toISOString() ?? null,
  };
}

/** What a setup holds, with what is to be changed; groups change field by field. */
export function changedFields(fields: SetupFields, changes: UpdateSetupRequest): SetupFields {
  return {
    name: changes.name ?? fields.name,
    kick: { ...fields.kick, ...changes.kick },
    overhead: { ...fields.overhead, ...changes.overhead },
    kickPreamp: { ...fields.kickPreamp, ...changes.kickPreamp },
    overheadPreamp: { ...fields.overheadPreamp, ...changes.overheadPreamp },
    interface: changes.interface ?? fields.interface,
    rest: changes.rest ?? fields.rest,
  };
}

export function fieldsOf(setup: SetupFields): SetupFields {
  const { name, kick, overhead, kickPreamp, overheadPreamp, interface: pluggedInto, rest } = setup;
  return { name, kick, overhead, kickPreamp, overheadPreamp, interface: pluggedInto, rest };
}
