/** What has been sent of one upload, and how fast it goes. */
export interface UploadProgress {
  startedAtMs: number;
  atMs: number;
  loadedBytes: number;
  /** Of the whole request; 0 until the browser tells. */
  totalBytes: number;
  /** Smoothed; null until there is something to judge by. */
  rateBytesPerS: number | null;
}

/** Time over which the speed is smoothed: long enough not to jump, short enough to follow a change of network. */
const smoothingS = 4;
/** Before this the first packets, which only fill buffers, would promise too much. */
const firstJudgedS = 0.7;

export const uploadStarted = (atMs: number): UploadProgress => ({
  startedAtMs: atMs,
  atMs,
  loadedBytes: 0,
  totalBytes: 0,
  rateBytesPerS: null,
});

export interface ProgressReport {
  atMs: number;
  loadedBytes: number;
  totalBytes: number;
}

/** Takes in one report of the browser. */
export function progressed(
  before: UploadProgress,
  { atMs, loadedBytes, totalBytes }: ProgressReport,
): UploadProgress {
  const next = { ...before, atMs, loadedBytes, totalBytes };
  const sinceStartS = (atMs - before.startedAtMs) / 1000;
  if (sinceStartS < firstJudgedS) return next;
  if (before.rateBytesPerS === null) return { ...next, rateBytesPerS: loadedBytes / sinceStartS };
  const stepS = (atMs - before.atMs) / 1000;
  if (stepS <= 0) return { ...next, atMs: before.atMs, rateBytesPerS: before.rateBytesPerS };
  const stepRate = (loadedBytes - before.loadedBytes) / stepS;
  const weight = 1 - Math.exp(-stepS / smoothingS);
  return { ...next, rateBytesPerS: before.rateBytesPerS + weight * (stepRate - before.rateBytesPerS) };
}

/** How much of one file is there. */
export interface FileProgress {
  sentBytes: number;
  sizeBytes: number;
  /** Until this file is there, with those before it; null when it can't be told yet. */
  secondsLeft: number | null;
}

/**
 * Files travel one after the other behind a few text fields, so what has been sent fills them in order. The fields and
 * the lines between the parts (about a kilobyte) are counted as sent first.
 */
export function fileProgress(sizesBytes: readonly number[], progress: UploadProgress): FileProgress[] {
  const wholeBytes = sizesBytes.reduce((sum, size) => sum + size, 0);
  const wrappingBytes = Math.max(0, progress.totalBytes - wholeBytes);
  const sentBytes = Math.max(0, progress.loadedBytes - wrappingBytes);
  let beforeBytes = 0;
  return sizesBytes.map((sizeBytes) => {
    const ownBytes = Math.min(sizeBytes, Math.max(0, sentBytes - beforeBytes));
    beforeBytes += sizeBytes;
    return { sentBytes: ownBytes, sizeBytes, secondsLeft: secondsFor(beforeBytes - sentBytes, progress) };
  });
}

function secondsFor(remainingBytes: number, { rateBytesPerS }: UploadProgress): number | null {
  if (remainingBytes <= 0) return 0;
  return rateBytesPerS === null || rateBytesPerS <= 0 ? null : remainingBytes / rateBytesPerS;
}
