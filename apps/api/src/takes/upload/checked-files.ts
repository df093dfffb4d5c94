import { UploadTrack } from '@thudline/contracts';
import { openWav, WavError, WavFacts } from '@thudline/dsp';
import { fileByteSource } from '@thudline/measure';
import { AppError } from '../../errors/app-error';
import { ReceivedFile } from './scratch-storage';

export interface CheckedFile extends ReceivedFile {
  facts: WavFacts;
}

/**
 * Reads the headers of an upload's files and holds them against what the tracks say.
 *
 * @throws {AppError} `wav-refused`, `rates-differ` or `bad-request`, each with one sentence that names the file
 */
export async function checkedFiles(files: ReceivedFile[], tracks: UploadTrack[]): Promise<CheckedFile[]> {
  const checked = await Promise.all(files.map(checkedFile));
  checkRates(checked);
  for (const track of tracks) checkTrack(track, checked);
  checked.forEach((file, index) => {
    if (!tracks.some((track) => track.fileIndex === index)) throw unused(file, index);
  });
  return checked;
}

async function checkedFile(file: ReceivedFile, fileIndex: number): Promise<CheckedFile> {
  const source = await fileByteSource(file.path);
  try {
    return { ...file, facts: (await openWav(source)).facts };
  } catch (error) {
    if (!(error instanceof WavError)) throw error;
    throw new AppError('wav-refused', `${file.name}: ${error.message}`, {
      details: { fileIndex, fileName: file.name, reason: error.code },
    });
  } finally {
    await source.close();
  }
}

function checkRates([first, second]: CheckedFile[]): void {
  if (!first || !second || first.facts.sampleRateHz === second.facts.sampleRateHz) return;
  const told = (file: CheckedFile) => `${file.name} has ${file.facts.sampleRateHz / 1000} kHz`;
  throw new AppError(
    'rates-differ',
    `${told(first)}, ${told(second)}: both files must come from one session. Export them with the same rate.`,
    { details: { fileIndex: 1, fileName: second.name } },
  );
}

function checkTrack({ role, fileIndex, channel }: UploadTrack, files: CheckedFile[]): void {
  const file = files[fileIndex];
  if (!file) {
    throw new AppError('bad-request', `The ${role} should be in file ${fileIndex + 1}, which was not sent.`);
  }
  if (channel < file.facts.channels) return;
  throw new AppError(
    'bad-request',
    `The ${role} should be channel ${channel + 1} of ${file.name}, which has ${file.facts.channels}.`,
    { details: { fileIndex, fileName: file.name } },
  );
}

const unused = (file: CheckedFile, fileIndex: number) =>
  new AppError('bad-request', `${file.name} is neither the kick nor the overhead. Leave it out.`, {
    details: { fileIndex, fileName: file.name },
  });
