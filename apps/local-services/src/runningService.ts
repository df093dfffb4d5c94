import { createServer, type RequestListener } from 'node:http';
import { type AddressInfo } from 'node:net';

/** The only address our services listen on. */
export const loopback = '127.0.0.1';

export interface RunningService {
  /** Such as `http://127.0.0.1:4702`. */
  url: string;
  /** Resolves when the port is free again; connections still open are cut. */
  stop(): Promise<void>;
}

/**
 * Serves on loopback; port 0 takes a free one.
 *
 * @throws {Error} the port is taken
 */
export async function serveOnLoopback(listener: RequestListener, port: number): Promise<RunningService> {
  const server = createServer(listener);
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, loopback, resolve);
  });
  const { port: boundPort } = server.address() as AddressInfo;
  return {
    url: `http://${loopback}:${boundPort}`,
    stop: () =>
      new Promise((resolve, reject) => {
        server.close((error) => (error ? reject(error) : resolve()));
        server.closeAllConnections();
      }),
  };
}
