import type { CreateTakeRequest } from '@thudline/contracts';
import type { Arrangement } from './arrangement';
import { recordedAt } from './recordedAt';
import { doneActions, type PreviousTake } from './previousTake';
import type { UploadState } from './uploadState';

/** What a request takes from beside the upload's own state. */
export interface TakeRest {
  previous: PreviousTake | null;
  setupId: string | null;
  roomId: string | null;
  nowMs: number;
}

/** The text fields of one upload. */
export function takeRequest(
  state: UploadState,
  { slots, used }: Arrangement,
  { previous, setupId, roomId, nowMs }: TakeRest,
): CreateTakeRequest {
  if (!state.uploadKey) throw new Error('An upload needs its key before it is sent.');
  return {
    uploadKey: state.uploadKey,
    title: state.title.trim(),
    note: state.note.trim(),
    recordedAt: recordedAt(
      used.map(({ file, reading }) => ({
        lastModified: file.lastModified,
        broadcast: reading.facts.broadcast,
      })),
      nowMs,
    ),
    ...(previous && state.follows
      ? { followsTakeId: previous.take.id, doneActions: doneActions(previous, state.tickedHere) }
      : { doneActions: [] }),
    ...(setupId ? { setupId } : {}),
    ...(roomId ? { roomId } : {}),
    tags: [],
    tracks: slots.map(({ role, channel, fileId }) => ({
      role,
      channel,
      fileIndex: used.findIndex(({ id }) => id === fileId),
    })),
  };
}

/** Text first, so that the server can refuse a take before its files travel. */
export function takeForm(request: CreateTakeRequest, files: readonly File[]): FormData {
  const form = new FormData();
  form.append('uploadKey', request.uploadKey);
  form.append('title', request.title);
  form.append('note', request.note);
  if (request.recordedAt) form.append('recordedAt', request.recordedAt);
  if (request.followsTakeId) form.append('followsTakeId', request.followsTakeId);
  if (request.setupId) form.append('setupId', request.setupId);
  if (request.roomId) form.append('roomId', request.roomId);
  form.append('doneActions', JSON.stringify(request.doneActions));
  form.append('tags', JSON.stringify(request.tags));
  form.append('tracks', JSON.stringify(request.tracks));
  for (const file of files) form.append('files', file, file.name);
  return form;
}
