import { randomUUID } from 'node:crypto';
import { readdir } from 'node:fs/promises';
import { AddressInfo, connect } from 'node:net';
import { paths } from '@thudline/contracts';
import { joined, origin, Person } from './person';
import { monoTracks } from './recordings';
import { TestApp } from './test-app';
import { until } from './until';

/** The cookies of a person, or of somebody who has just joined. */
export async function cookieOf(test: TestApp, known?: Person): Promise<string> {
  const person = known ?? (await joined(test));
  const response = await person.post(paths.refresh);
  const lines = response.headers['set-cookie'] as unknown as string[];
  return lines.map((line) => line.split(';')[0]).join('; ');
}

/** Sends a request's head and no body, and gives what comes back. */
export async function rawRequest({ server }: TestApp, head: string[]): Promise<string> {
  const socket = connect((server.address() as AddressInfo).port, '127.0.0.1');
  socket.write(`${head.join('\r\n')}\r\n\r\n`);
  const answer = await new Promise<string>((resolve, reject) => {
    let text = '';
    socket.on('error', reject);
    socket.on('data', (chunk: Buffer) => {
      text += chunk.toString();
      if (text.includes('}')) resolve(text);
    });
  });
  socket.destroy();
  return answer;
}

/** The body of an upload, with the boundary `x`. */
export function multipart(bytes: Uint8Array): Buffer {
  const field = (name: string, value: string) =>
    `--x\r\nContent-Disposition: form-data; name="${name}"\r\n\r\n${value}\r\n`;
  const head =
    field('uploadKey', randomUUID()) +
    field('tracks', JSON.stringify(monoTracks)) +
    '--x\r\nContent-Disposition: form-data; name="files"; filename="kick.wav"\r\nContent-Type: audio/wav\r\n\r\n';
  return Buffer.concat([Buffer.from(head), bytes, Buffer.from('\r\n--x--\r\n')]);
}

/** Sends part of a body, waits until the server is writing it to scratch, then cuts the line. */
export async function brokenUpload(test: TestApp, body: Buffer, sentBytes: number): Promise<void> {
  const socket = connect((test.server.address() as AddressInfo).port, '127.0.0.1');
  const cookie = await cookieOf(test);
  socket.write(
    [
      `POST ${paths.takes} HTTP/1.1`,
      'Host: thudline.test',
      `Origin: ${origin}`,
      'X-Thudline: 1',
      `Cookie: ${cookie}`,
      'Content-Type: multipart/form-data; boundary=x',
      `Content-Length: ${body.length}`,
      '',
      '',
    ].join('\r\n'),
  );
  socket.write(body.subarray(0, sentBytes));
  await until(async () => (await readdir(test.config.scratchDir)).length === 1);
  socket.destroy();
  await until(async () => (await readdir(test.config.scratchDir)).length === 0);
}
