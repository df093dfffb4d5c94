import type { BroadcastFacts } from '@thudline/dsp';

const dayMs = 24 * 60 * 60 * 1000;
const maxAgeMs = 30 * dayMs;
const maxClockAgeMs = 10 * 365 * dayMs;

export interface RecordedFile {
  lastModified: number;
  broadcast: Pick<BroadcastFacts, 'date' | 'time'> | null;
}

/**
 * When a take was recorded: by the recorder's clock, where it wrote date and time into a file; else by when the files were
 * last written. A recorder or an export writes them within minutes to days of playing, and several takes keep their order.
 * A file that was copied or unpacked may carry any date, so one that is more than 30 days old or lies in the future is not
 * believed: then it is now.
 */
export function recordedAt(files: readonly RecordedFile[], nowMs: number): string {
  const clocksMs = files.map(({ broadcast }) => clockMs(broadcast)).filter((ms) => isSet(ms, nowMs));
  if (clocksMs.length > 0) return new Date(Math.max(...clocksMs)).toISOString();
  const latestMs = Math.max(...files.map((file) => file.lastModified));
  const believed = latestMs <= nowMs && nowMs - latestMs <= maxAgeMs;
  return new Date(believed ? latestMs : nowMs).toISOString();
}

/** The recorder knows no time zone; it is taken to hang where its files are sent from. */
function clockMs(broadcast: RecordedFile['broadcast']): number {
  if (!broadcast?.date || !broadcast.time) return NaN;
  return new Date(`${broadcast.date}T${broadcast.time}`).getTime();
}

/** A clock that nobody ever set runs from the first of January of some year. */
function isSet(ms: number, nowMs: number): boolean {
  const date = new Date(ms);
  const isUnset = date.getMonth() === 0 && date.getDate() === 1 && nowMs - ms > maxAgeMs;
  return ms <= nowMs && nowMs - ms <= maxClockAgeMs && !isUnset;
}
