import { basename } from 'node:path';
import { guessSides, lowEndRatio, reportFigures, reportLine } from '@thudline/dsp';
import { measureFiles } from '../measureFiles';
import { MeasureRefusal } from '../measureRefusal';
import { withOpenFiles } from '../openFiles';
import type { TrackChoice } from '../trackChoice';
import { commandLine, usage, UsageError, type CommandLine } from './commandLine';
import { reportText } from './reportText';
import { roundedNumbers } from './roundedNumbers';

export interface CommandResult {
  /** 0 measured, 2 refused. */
  readonly exitCode: 0 | 2;
  readonly stdout: string;
  readonly stderr: string;
}

/**
 * What `npm run measure` prints and ends with; the process itself stays outside.
 *
 * @param words - of the command line, without node and the script
 */
export async function measureCommand(words: readonly string[]): Promise<CommandResult> {
  let paths: readonly string[] = [];
  try {
    const command = await commandLine(words);
    paths = command.paths;
    return { exitCode: 0, stdout: command.help ? usage : await report(command), stderr: '' };
  } catch (error) {
    if (error instanceof UsageError) return { exitCode: 2, stdout: '', stderr: `${error.message}\n` };
    if (error instanceof MeasureRefusal)
      return { exitCode: 2, stdout: '', stderr: `${refusalSentence(error, paths)}\n` };
    throw error;
  }
}

async function report(command: CommandLine): Promise<string> {
  const tracks = await chosenChannels(command);
  const { take, files } = await measureFiles({ files: command.paths.map((path) => ({ path })), tracks });
  const { target, temperatureC } = command;
  const figures = reportFigures(take.facts, { target, temperatureC });
  if (command.json) return `${JSON.stringify(roundedNumbers(figures), null, 2)}\n`;
  return reportText({ line: reportLine(figures, { lengthUnit: 'metre', target }), figures, files, tracks });
}

/** Two files: their first channels, in the order kick, overhead. One file: its sides, guessed where not said. */
async function chosenChannels({ paths, channels }: CommandLine): Promise<TrackChoice[]> {
  const overheadFile = paths.length - 1;
  const { kick, overhead } =
    channels ?? (overheadFile === 1 ? { kick: 0, overhead: 0 } : await guessedSides(paths));
  return [
    { role: 'kick', fileIndex: 0, channel: kick },
    { role: 'overhead', fileIndex: overheadFile, channel: overhead },
  ];
}

async function guessedSides(paths: readonly string[]): Promise<{ kick: number; overhead: number }> {
  return withOpenFiles(paths, async (files) => {
    const wav = files.at(0)?.wav;
    if (wav?.facts.channels !== 2) {
      throw new MeasureRefusal({
        code: 'no-such-channel',
        message: `One file needs two channels, a microphone on each; this one has ${wav?.facts.channels ?? 0}, so name a second file or use --channel.`,
        fileIndex: 0,
      });
    }
    const ratios = [await lowEndRatio(wav.track(0)), await lowEndRatio(wav.track(1))] as const;
    const { kickChannel, overheadChannel } = guessSides(basename(paths.join()), ratios);
    return { kick: kickChannel, overhead: overheadChannel };
  });
}

function refusalSentence(refusal: MeasureRefusal, paths: readonly string[]): string {
  const path = refusal.fileIndex === null ? undefined : paths[refusal.fileIndex];
  return path === undefined ? refusal.message : `${basename(path)}: ${refusal.message}`;
}
