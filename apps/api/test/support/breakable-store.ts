import { AddressInfo, connect, createServer, Socket } from 'node:net';
import { requireTestServices } from './test-config';

export interface BreakableStore {
  url: string;
  /** From now on every connection breaks, or those break that have carried this many bytes to the store. */
  breakAfter(bytes: number): void;
  mend(): void;
  close(): Promise<void>;
}

/** A line to the real object store that can be cut, also in the middle of a file. */
export async function startBreakableStore(): Promise<BreakableStore> {
  requireTestServices();
  const target = new URL(process.env.S3_ENDPOINT ?? '');
  const sockets = new Set<Socket>();
  let budgetBytes = Infinity;
  const server = createServer((client) => {
    const store = connect(Number(target.port), target.hostname);
    for (const socket of [client, store]) {
      sockets.add(socket);
      socket.on('error', () => socket.destroy());
      socket.on('close', () => {
        sockets.delete(socket);
        client.destroy();
        store.destroy();
      });
    }
    client.on('data', (chunk) => {
      budgetBytes -= chunk.length;
      if (budgetBytes < 0) {
        client.destroy();
      } else if (!store.write(chunk)) {
        client.pause();
        store.once('drain', () => client.resume());
      }
    });
    client.on('end', () => store.end());
    store.pipe(client);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    breakAfter: (bytes) => (budgetBytes = bytes),
    mend: () => (budgetBytes = Infinity),
    close: () =>
      new Promise((resolve) => {
        for (const socket of sockets) socket.destroy();
        server.close(() => resolve());
      }),
  };
}
