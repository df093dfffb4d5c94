import { createHash, randomUUID } from 'node:crypto';
import { setTimeout as delay } from 'node:timers/promises';
import { paths, takeResponse } from '@thudline/contracts';
import { Random, takeFiles } from '@thudline/fixtures';
import { Session } from '../lib/session';

/** One take that somebody tried to send. */
export interface SentTake {
  uploadKey: string;
  files: Buffer[];
  sha256: string[];
  /** The server said that it has it. */
  takeId: string | null;
}

export interface Uploads {
  sent: readonly SentTake[];
  /** Lets one more take be sent. */
  allow: () => void;
  /** Waits for what is on its way. */
  end(): Promise<void>;
}

const clients = 2;
const retried = 0.6;
const pauseMs = 20;

/** Sends takes one after the other on a few lines at once; some that fail are sent again under their key, others are given up. */
export function startUploads(session: Session, random: Random): Uploads {
  const { kick, overhead } = takeFiles('one-hit');
  const sent: SentTake[] = [];
  let allowed = 0;
  let isOver = false;

  const next = (): SentTake => {
    // The last samples differ from take to take, so that no two have the same bytes.
    const files = [kick, overhead].map((bytes, index) => {
      const copy = Buffer.from(bytes);
      copy.writeUInt32LE(sent.length * 2 + index + 1, copy.length - 8);
      return copy;
    });
    const take = { uploadKey: randomUUID(), files, sha256: files.map(sha256Of), takeId: null };
    sent.push(take);
    return take;
  };

  const client = async () => {
    while (!isOver) {
      if (allowed === 0) {
        await delay(pauseMs);
        continue;
      }
      allowed -= 1;
      const take = next();
      for (;;) {
        take.takeId = await sendTake(session, take).catch(() => null);
        if (take.takeId || random.uniform() > retried) break;
        await delay(200);
      }
    }
  };
  const running = Array.from({ length: clients }, client);
  return {
    sent,
    allow: () => (allowed += 1),
    async end() {
      isOver = true;
      await Promise.all(running);
    },
  };
}

/** @returns id of the take; null where the server refused it for now */
export async function sendTake(session: Session, take: SentTake): Promise<string | null> {
  const form = new FormData();
  form.set('uploadKey', take.uploadKey);
  const track = (role: string, fileIndex: number) => ({ role, fileIndex, channel: 0 });
  form.set('tracks', JSON.stringify([track('kick', 0), track('overhead', 1)]));
  for (const [index, name] of ['kick.wav', 'overhead.wav'].entries()) {
    form.append('files', new Blob([new Uint8Array(take.files[index] ?? [])], { type: 'audio/wav' }), name);
  }
  const { status, json } = await session.post(paths.takes, form);
  return status === 200 || status === 201 ? takeResponse.parse(json).id : null;
}

export const sha256Of = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex');
