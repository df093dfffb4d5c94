/**
 * Ports and secrets of this checkout: made once, kept in one file that only its owner can read, and printed as
 * `NAME=value` lines that need no quoting. Depends on nothing but Node, because it runs before `npm ci` has.
 *
 *   node settings.mjs <file> [--port NAME=<preferred>]... [--secret NAME]... [--password NAME]...
 *
 * A kept port that is taken just now is replaced for this run only. A preferred port of 0 means any free one.
 */
import { randomBytes, randomInt } from 'node:crypto';
import { mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { dirname } from 'node:path';

/** For passwords that people type; with four digits they are for a demo on loopback, nothing else. */
const words = [
  'brush',
  'felt',
  'ghost',
  'hoop',
  'maple',
  'mallet',
  'rim',
  'shell',
  'stick',
  'throne',
  'washer',
  'wire',
];

function readKept(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch (error) {
    if (error.code === 'ENOENT') return {};
    throw new Error(`${file} can't be read (${error.message}).`);
  }
}

/** Written beside and renamed, so that a second process never reads half a file. */
function keep(file, kept) {
  mkdirSync(dirname(file), { recursive: true, mode: 0o700 });
  writeFileSync(`${file}.new`, `${JSON.stringify(kept, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${file}.new`, file);
}

/** Holds the port it found until all are found, so that two names never get the same one. */
function tryPort(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(null));
    server.listen(port, '127.0.0.1', () => resolve(server));
  });
}

async function choosePort(wished) {
  for (const port of wished) {
    const server = await tryPort(port);
    if (server) return server;
  }
  throw new Error('No free port was found on 127.0.0.1.');
}

const wordFromList = () => words[randomInt(words.length)];
const makers = {
  '--secret': () => randomBytes(32).toString('hex'),
  '--password': () => `${wordFromList()}-${wordFromList()}-${randomInt(1000, 10_000)}`,
};

async function main([file, ...options]) {
  const kept = readKept(file);
  const held = [];
  const lines = [];
  for (let i = 0; i < options.length; i += 2) {
    const [kind, wish] = [options[i], options[i + 1]];
    const [name, preferred] = wish.split('=');
    if (kind === '--port') {
      const server = await choosePort(
        [kept[name], Number(preferred), 0].filter((port) => port !== undefined),
      );
      held.push(server);
      kept[name] ??= server.address().port;
      lines.push(`${name}=${server.address().port}`);
    } else {
      kept[name] ??= makers[kind]();
      lines.push(`${name}=${kept[name]}`);
    }
  }
  await Promise.all(held.map((server) => new Promise((resolve) => server.close(resolve))));
  keep(file, kept);
  process.stdout.write(`${lines.join('\n')}\n`);
}

main(process.argv.slice(2)).catch((error) => {
  process.stderr.write(`${error.message}\n`);
  process.exitCode = 1;
});
