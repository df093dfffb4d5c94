import { execFileSync } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { Client } from 'pg';
import { isListening } from './ports';
import { createProgram, Program } from './program';
import { waitUntil } from './waiting';

export interface PostgresServer {
  url: string;
  program: Program;
  start(): Promise<void>;
  /** SIGQUIT is PostgreSQL's immediate stop: as when the machine dies, without what memory held. */
  stopAtOnce(): Promise<void>;
  query<Row extends object>(text: string, values?: unknown[]): Promise<Row[]>;
  remove(): void;
}

/** A server of its own with everything on that keeps data safe, in a folder under /tmp; `root` runs it as `postgres`. */
export function makePostgres(port: number, logPath: string): PostgresServer {
  const bin = newestServer();
  const isRoot = process.getuid?.() === 0;
  const run = (command: string, ...args: string[]) => {
    const all = isRoot ? ['-u', 'postgres', '--', command, ...args] : args;
    return execFileSync(isRoot ? 'runuser' : command, all, { cwd: '/', encoding: 'utf8' });
  };
  const folder = isRoot
    ? run('mktemp', '-d', '/tmp/thudline-check-XXXXXX').trim()
    : mkdtempSync('/tmp/thudline-check-');
  const data = join(folder, 'data');
  // Nobody else can reach it but over loopback, and it lives for minutes.
  run(join(bin, 'initdb'), '-D', data, '-U', 'thudline', '--auth=trust', '--locale=C.UTF-8', '-E', 'UTF8');
  const server = [join(bin, 'postgres'), '-D', data, '-p', String(port), '-c', 'listen_addresses=127.0.0.1'];
  const program = createProgram({
    command: [...server, '-c', 'unix_socket_directories='],
    as: isRoot ? ['--reuid=postgres', '--regid=postgres', '--init-groups'] : [],
    env: process.env,
    logPath,
    cwd: '/',
  });
  const url = `postgresql://thudline@127.0.0.1:${port}/postgres`;
  const query = async <Row extends object>(text: string, values: unknown[] = []): Promise<Row[]> => {
    const client = new Client({ connectionString: url });
    client.on('error', () => undefined);
    await client.connect();
    try {
      return (await client.query<Row>(text, values)).rows;
    } finally {
      await client.end();
    }
  };
  return {
    url,
    program,
    query,
    async start() {
      program.start();
      const answers = async () => (await isListening(port)) && (await query('select 1')).length === 1;
      await waitUntil('PostgreSQL answers', answers, 30_000);
    },
    stopAtOnce: () => program.stop('SIGQUIT'),
    remove: () => rmSync(folder, { recursive: true, force: true }),
  };
}

function newestServer(): string {
  const root = '/usr/lib/postgresql';
  const newest = readdirSync(root).sort((one, other) => Number(other) - Number(one))[0];
  if (!newest) throw new Error(`There is no PostgreSQL in ${root}.`);
  return join(root, newest, 'bin');
}
