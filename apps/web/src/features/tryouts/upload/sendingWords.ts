import { aboutTimeLeft, sentWords } from '../../upload/uploadWords';
import type { Sending } from './sendQueue';

export interface SendingWords {
  /** "3 of 12 takes sent" */
  takes: string;
  /** "84 of 150.2 MB" */
  bytes: string;
  /** "About 40 seconds left." */
  left: string;
  /** 0–1 of all bytes. */
  share: number;
  isOver: boolean;
  failed: { name: string; message: string }[];
}

/** All pairs on their way, as one. */
export function sendingWords({ jobs, progress }: Sending): SendingWords {
  const sum = (bytesOf: (job: Sending['jobs'][number]) => number) =>
    jobs.reduce((all, job) => all + bytesOf(job), 0);
  const sentBytes = sum((job) => job.sentBytes);
  const sizeBytes = sum((job) => job.sizeBytes);
  const sent = jobs.filter(({ state }) => state === 'sent').length;
  const isOver = jobs.every(({ state }) => state === 'sent' || state === 'failed');
  const { rateBytesPerS } = progress;
  const secondsLeft =
    rateBytesPerS !== null && rateBytesPerS > 0 ? (sizeBytes - sentBytes) / rateBytesPerS : null;
  return {
    takes: `${sent} of ${jobs.length} takes sent`,
    bytes: sentWords(sentBytes, sizeBytes),
    left: isOver ? '' : aboutTimeLeft(secondsLeft),
    share: sizeBytes === 0 ? 0 : sentBytes / sizeBytes,
    isOver,
    failed: jobs.flatMap(({ state, files, message }) =>
      state === 'failed' ? { name: files.map(({ name }) => name).join(' and '), message } : [],
    ),
  };
}
