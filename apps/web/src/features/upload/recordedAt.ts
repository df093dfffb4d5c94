const maxAgeMs = 30 * 24 * 60 * 60 * 1000;

/**
 * When a take was recorded, told by when its files were last written. A recorder or an export writes them within
 * minutes to days of playing, and several takes keep their order. A file that was copied or unpacked may carry any date,
 * so one that is more than 30 days old or lies in the future is not believed: then it is now.
 */
export function recordedAt(files: readonly { lastModified: number }[], nowMs: number): string {
  const latestMs = Math.max(...files.map((file) => file.lastModified));
  const believed = latestMs <= nowMs && nowMs - latestMs <= maxAgeMs;
  return new Date(believed ? latestMs : nowMs).toISOString();
}
