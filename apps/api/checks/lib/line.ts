import { connect, createServer, Socket } from 'node:net';
import { setTimeout as delay } from 'node:timers/promises';

export interface Line {
  port: number;
  /** Breaks every connection there is; new ones are taken again. */
  cut(): number;
  close(): Promise<void>;
}

/** A line to a port of this machine that is as slow as somebody's at home, and can be cut. */
export async function openLine(options: {
  port: number;
  toPort: number;
  bytesPerSecond: number;
}): Promise<Line> {
  const sockets = new Set<Socket>();
  const server = createServer((client) => {
    const target = connect(options.toPort, '127.0.0.1');
    for (const socket of [client, target]) {
      sockets.add(socket);
      socket.on('error', () => socket.destroy());
      socket.on('close', () => {
        sockets.delete(socket);
        client.destroy();
        target.destroy();
      });
    }
    client.on('data', (chunk: Buffer) => {
      client.pause();
      target.write(chunk);
      void delay((chunk.length / options.bytesPerSecond) * 1000).then(() => client.resume());
    });
    client.on('end', () => target.end());
    target.pipe(client);
  });
  await new Promise<void>((resolve) => server.listen(options.port, '127.0.0.1', resolve));
  const cut = () => {
    const count = sockets.size / 2;
    for (const socket of sockets) socket.resetAndDestroy();
    return count;
  };
  return {
    port: options.port,
    cut,
    close: () => {
      cut();
      return new Promise((resolve) => server.close(() => resolve()));
    },
  };
}
