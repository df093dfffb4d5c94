import { cpSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';
import { Count, lookAfterwards } from './faults/afterwards';
import { FaultContext, FaultKind, faultKinds } from './faults/kinds';
import { startSystem } from './faults/system';
import { startUploads } from './faults/uploads';
import { createRandom, Random } from '@thudline/fixtures';
import { between, shuffled } from './lib/random';
import { joinAs } from './lib/session';

const playerName = 'Sabel';

/** `npm run check:faults [-- --faults=200 --seed=1]`: breaks the running product again and again, and counts what was lost. */
async function main(): Promise<void> {
  const [count, seed] = [option('faults', 200), option('seed', 1)];
  const random = createRandom(seed);
  const system = await startSystem();
  process.once('SIGINT', () => void system.stop().then(() => process.exit(130)));
  let isGood = false;
  try {
    if (!system.hasOwnDisk)
      print('The store has no disk of its own here (not root): its disk is not filled.');
    const player = await joinAs(system.url, playerName);
    const uploads = startUploads(player, random);
    const context = {
      system,
      random,
      player,
      playerEmail: `${playerName.toLowerCase()}@example.org`,
      promisedMails: [],
    };
    const recoveries = await strikeAll(inOrder(random, count), context, uploads.allow);
    await uploads.end();
    printFaults(recoveries, seed);
    const counts = await lookAfterwards(system, player, uploads.sent, context.promisedMails);
    isGood = printCounts(counts);
  } finally {
    const kept = process.env.KEEP_LOGS;
    if (kept) cpSync(system.folder, kept, { recursive: true, filter: (path) => !path.includes('/objects') });
    await system.stop();
  }
  if (!isGood) process.exitCode = 1;
}

/** Each kind as often as the others, in an order that the seed gives. */
function inOrder(random: Random, count: number): FaultKind[] {
  const faults: FaultKind[] = [];
  while (faults.length < count) faults.push(...shuffled(random, faultKinds));
  return faults.slice(0, count);
}

async function strikeAll(faults: readonly FaultKind[], context: FaultContext, allowTake: () => void) {
  const recoveries = new Map<string, number[]>();
  for (const fault of faults) {
    allowTake();
    allowTake();
    await delay(between(context.random, 0, 900));
    await fault.strike(context);
    const ms = await context.system.recovered();
    recoveries.set(fault.name, [...(recoveries.get(fault.name) ?? []), ms]);
  }
  return recoveries;
}

function printFaults(recoveries: ReadonlyMap<string, readonly number[]>, seed: number): void {
  const total = [...recoveries.values()].reduce((sum, { length }) => sum + length, 0);
  print(`\n${total} faults, seed ${seed}        times   answered again after: median, longest`);
  for (const [name, times] of recoveries) {
    const sorted = [...times].sort((one, other) => one - other);
    const [median, longest] = [sorted[sorted.length >> 1] ?? 0, sorted.at(-1) ?? 0];
    print(`${name.padEnd(30)} ${String(times.length).padStart(4)}   ${seconds(median)} ${seconds(longest)}`);
  }
}

function printCounts(counts: readonly Count[]): boolean {
  print('\nAfterwards');
  for (const { what, found, wanted } of counts) {
    const verdict = wanted === null ? '    ' : found === wanted ? 'pass' : 'FAIL';
    print(`${verdict}  ${String(found).padStart(5)}  ${what}`);
  }
  return counts.every(({ found, wanted }) => wanted === null || found === wanted);
}

const seconds = (ms: number) => `${(ms / 1000).toFixed(1).padStart(6)} s`;
const print = (line: string) => process.stdout.write(`${line}\n`);

function option(name: string, otherwise: number): number {
  const given = process.argv.find((argument) => argument.startsWith(`--${name}=`))?.split('=')[1];
  const value = given === undefined ? otherwise : Number(given);
  if (!Number.isInteger(value) || value < 1) throw new Error(`--${name} is a whole number from 1.`);
  return value;
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  process.exit(1);
});
