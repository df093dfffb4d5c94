import type { MessagePort } from 'node:worker_threads';
import { addFiles, type AddedFacts, type AddFilesOptions } from './addFiles';
import { MeasureRefusal, type MeasureRefusalFacts } from './measureRefusal';

/** What a worker thread is given; everything in it can cross a thread. */
export interface AddJob extends Omit<AddFilesOptions, 'onProgress'> {
  /** Takes a number from 0 to 1 at every step worth telling. */
  readonly port?: MessagePort;
}

export type AddJobResult =
  | { readonly outcome: 'added'; readonly facts: AddedFacts }
  | { readonly outcome: 'refused'; readonly refusal: MeasureRefusalFacts };

/** Makes an added file in a worker thread (for piscina: `filename` of the worker module, `name: 'addJob'`). */
export async function addJob({ port, ...options }: AddJob): Promise<AddJobResult> {
  let told = 0;
  const onProgress = (progress: number): void => {
    if (progress - told < 0.02) return;
    told = progress;
    port?.postMessage(progress);
  };
  try {
    return { outcome: 'added', facts: await addFiles({ ...options, onProgress }) };
  } catch (error) {
    if (error instanceof MeasureRefusal) return { outcome: 'refused', refusal: error.toFacts() };
    throw error;
  } finally {
    port?.close();
  }
}
