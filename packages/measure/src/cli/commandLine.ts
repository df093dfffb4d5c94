import { parseArgs } from 'node:util';
import type { Target } from '@thudline/contracts';

export interface CommandLine {
  readonly paths: readonly string[];
  readonly json: boolean;
  readonly help: boolean;
  /** Channel of the kick and of the overhead, from 0; null leaves it to the files. */
  readonly channels: { readonly kick: number; readonly overhead: number } | null;
  readonly temperatureC: number;
  readonly target: Target;
}

/** Something on the command line that can't be meant; the message is one sentence. */
export class UsageError extends Error {
  override readonly name = 'UsageError';
}

export const usage = `npm run measure -- kick.wav overhead.wav [options]
npm run measure -- both.wav [options]            one file with a microphone on each channel

  --json                  the report as JSON
  --channel k:o           channel of the kick and of the overhead, from 0 (one stereo file: 0:1)
  --temperature-c 20      air temperature, for the path difference
  --target -12:-6         where the hardest hit should peak, dBFS
  --aim -9                the level to set the preamp for, dBFS
  --help                  this text

Ends with 0 when measured and 2 when refused, with one sentence on standard error.
`;

/** The settings that a new account has, which a test holds to; their package takes longer to load than a minute to measure. */
export const commandDefaults = { temperatureC: 20, target: { lowDbfs: -12, highDbfs: -6, aimDbfs: -9 } };

const options = {
  json: { type: 'boolean' },
  help: { type: 'boolean', short: 'h' },
  channel: { type: 'string' },
  'temperature-c': { type: 'string' },
  target: { type: 'string' },
  aim: { type: 'string' },
} as const;

/**
 * What the words of a command line mean.
 *
 * @param words - without node and the script
 * @throws {UsageError} one sentence about the word that can't be meant
 */
export async function commandLine(words: readonly string[]): Promise<CommandLine> {
  const { values, positionals } = parsed(words);
  if (!values.help && (positionals.length < 1 || positionals.length > 2)) {
    throw new UsageError(
      `Name a kick file and an overhead file, or one stereo file; ${positionals.length} were named.`,
    );
  }
  return {
    paths: positionals,
    json: values.json ?? false,
    help: values.help ?? false,
    channels: values.channel === undefined ? null : channels(values.channel),
    temperatureC: temperature(values['temperature-c']),
    target: await target(values.target, values.aim),
  };
}

function parsed(words: readonly string[]) {
  try {
    return parseArgs({ args: withNegativeValues(words), options, allowPositionals: true });
  } catch (error) {
    const [sentence] = (error as Error).message.split(/[.\n]/);
    throw new UsageError(`${sentence}; --help lists every option.`);
  }
}

/** `--target -12:-6` is meant as it stands, though parseArgs wants `--target=-12:-6`. */
function withNegativeValues(words: readonly string[]): string[] {
  const joined: string[] = [];
  for (const word of words) {
    const before = joined.at(-1);
    if (/^-\d/.test(word) && before && /^--[a-z-]+$/.test(before)) joined.splice(-1, 1, `${before}=${word}`);
    else joined.push(word);
  }
  return joined;
}

function channels(text: string): CommandLine['channels'] {
  const match = /^(\d{1,2}):(\d{1,2})$/.exec(text);
  if (!match) throw new UsageError(`--channel takes two channels from 0, such as 0:1, not "${text}".`);
  return { kick: Number(match[1]), overhead: Number(match[2]) };
}

function temperature(text: string | undefined): number {
  if (text === undefined) return commandDefaults.temperatureC;
  const value = number(text);
  // The range of packages/contracts, userSettings.
  if (value === null || value < -20 || value > 50) {
    throw new UsageError(`--temperature-c takes −20 to 50 degrees, not "${text}".`);
  }
  return value;
}

async function target(range: string | undefined, aim: string | undefined): Promise<Target> {
  const { lowDbfs, highDbfs, aimDbfs } = commandDefaults.target;
  if (range === undefined && aim === undefined) return commandDefaults.target;
  const ends = range?.split(':').map(number) ?? [lowDbfs, highDbfs];
  const [low, high] = ends;
  if (ends.length !== 2 || low == null || high == null) {
    throw new UsageError(`--target takes two levels such as -12:-6, not "${range}".`);
  }
  const wanted = aim === undefined ? Math.min(high, Math.max(low, aimDbfs)) : number(aim);
  // Loaded only where it is needed.
  const contracts = await import('@thudline/contracts');
  const checked = contracts.target.safeParse({ lowDbfs: low, highDbfs: high, aimDbfs: wanted });
  if (checked.success) return checked.data;
  const issue = checked.error.issues[0];
  throw new UsageError(
    issue?.code === 'custom' ? issue.message : 'Target and aim are levels between −40 and −1 dBFS.',
  );
}

function number(text: string): number | null {
  return /^[-−+]?\d+(\.\d+)?$/.test(text) ? Number(text.replace('−', '-')) : null;
}
