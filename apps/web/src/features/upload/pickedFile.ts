import type { WavFacts } from '@thudline/dsp';

/** What the page knows of a file before anything is sent. */
export type FileReading =
  | { kind: 'reading' }
  | {
      kind: 'ready';
      facts: WavFacts;
      /** Of the first two channels, 0–1; null for silence. */
      lowEndRatios: (number | null)[];
    }
  | {
      kind: 'refused';
      /** One sentence for people, without the file's name. */
      message: string;
    };

/** A file somebody dropped or chose. */
export interface PickedFile {
  id: string;
  file: File;
  reading: FileReading;
}

export type ReadyFile = PickedFile & { reading: Extract<FileReading, { kind: 'ready' }> };

export const isReady = (picked: PickedFile): picked is ReadyFile => picked.reading.kind === 'ready';
