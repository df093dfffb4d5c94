import { openWav, WavError, type WavFile } from '@thudline/dsp/measuring';
import { fileByteSource, type FileByteSource } from './fileByteSource';
import { MeasureRefusal } from './measureRefusal';

/** A WAV file on a disk whose header was read and found good. */
export interface OpenFile {
  readonly path: string;
  readonly source: FileByteSource;
  readonly wav: WavFile;
}

/**
 * Opens files, hands them over and closes them, whatever happens in between.
 *
 * @throws {MeasureRefusal} `unreadable` or `wav-refused`, with the file it speaks of
 */
export async function withOpenFiles<Result>(
  paths: readonly string[],
  use: (files: readonly OpenFile[]) => Promise<Result>,
): Promise<Result> {
  const files: OpenFile[] = [];
  try {
    for (const [fileIndex, path] of paths.entries()) files.push(await openFile(path, fileIndex));
    return await use(files);
  } finally {
    await Promise.all(files.map((file) => file.source.close()));
  }
}

async function openFile(path: string, fileIndex: number): Promise<OpenFile> {
  const source = await readableSource(path, fileIndex);
  try {
    return { path, source, wav: await openWav(source) };
  } catch (error) {
    await source.close();
    throw refused(error, fileIndex);
  }
}

/** System errors that are the caller's to mend. */
const unreadable: Readonly<Record<string, string>> = {
  ENOENT: 'There is no such file; check its name and folder.',
  EISDIR: 'This is a folder, not a file; name the WAV file in it.',
  EACCES: 'This file may not be read; check who owns it.',
};

async function readableSource(path: string, fileIndex: number): Promise<FileByteSource> {
  try {
    return await fileByteSource(path);
  } catch (error) {
    throw refused(error, fileIndex);
  }
}

/** @returns a refusal for what a player can mend; anything else unchanged */
function refused(error: unknown, fileIndex: number): unknown {
  if (error instanceof WavError) {
    return new MeasureRefusal({ code: 'wav-refused', message: error.message, fileIndex, reason: error.code });
  }
  const message = unreadable[(error as NodeJS.ErrnoException).code ?? ''];
  return message ? new MeasureRefusal({ code: 'unreadable', message, fileIndex }) : error;
}
