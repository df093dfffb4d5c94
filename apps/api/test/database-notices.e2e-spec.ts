import { AddressInfo, connect, createServer, Server, Socket } from 'node:net';
import { Logger } from '@nestjs/common';
import { Client } from 'pg';
import { Config } from '../src/config/config';
import { DatabaseNotices } from '../src/events/database-notices';
import { createTestDatabase, TestDatabase } from './support/test-database';
import { until } from './support/until';

const takeId = '01890000-0000-7000-8000-000000000000';

describe('the connection that listens', () => {
  let database: TestDatabase;
  let server: Server;
  const lines = new Set<{ client: Socket; server: Socket }>();
  let notices: DatabaseNotices;
  const heard: string[] = [];
  let gaps = 0;

  beforeAll(async () => {
    jest.spyOn(Logger.prototype, 'warn').mockReturnValue(undefined);
    database = await createTestDatabase();
    const { hostname, port } = new URL(database.url);
    server = createServer((client) => {
      const line = { client, server: connect(Number(port), hostname) };
      lines.add(line);
      for (const socket of Object.values(line)) socket.on('error', () => undefined);
      client.pipe(line.server).pipe(client);
    });
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    const url = new URL(database.url);
    url.port = String((server.address() as AddressInfo).port);
    notices = new DatabaseNotices({ databaseUrl: url.href } as Config);
    notices.listen({
      onMeasurement: (id) => heard.push(id),
      onTakeAdded: () => undefined,
      onNotes: () => undefined,
      onGap: () => (gaps += 1),
    });
    await notices.onApplicationBootstrap();
  });
  afterAll(async () => {
    await notices?.beforeApplicationShutdown();
    for (const line of lines) Object.values(line).forEach((socket) => socket.destroy());
    server?.close();
    await database?.drop();
    jest.restoreAllMocks();
  });

  const tell = async () => {
    const client = new Client({ connectionString: database.url });
    await client.connect();
    await client.query(`select pg_notify('thudline_measurement', $1)`, [takeId]);
    await client.end();
  };
  /** As when a router in between forgets the line: nobody is told, and nothing arrives any more. */
  const cutWithoutAWord = () => {
    for (const { client, server: far } of lines) {
      client.unpipe(far);
      far.unpipe(client);
    }
  };

  it('stays while the database answers', async () => {
    await notices.check();
    await tell();
    await until(() => Promise.resolve(heard.length === 1));
    expect([lines.size, gaps]).toEqual([1, 0]);
  });

  it('is made anew when the line was cut without a word, and tells of the gap', async () => {
    cutWithoutAWord();
    await notices.check();
    await until(() => Promise.resolve(gaps === 1));
    await tell();
    await until(() => Promise.resolve(heard.length === 2));
    expect(lines.size).toBe(2);
  });
});
