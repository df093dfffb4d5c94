import { get, IncomingMessage } from 'node:http';
import { AddressInfo } from 'node:net';
import {
  eventNames,
  measurementEvent,
  MeasurementEvent,
  NotesEvent,
  paths,
  TakeAddedEvent,
} from '@thudline/contracts';
import { cookieOf } from './raw-upload';
import { Person } from './person';
import { TestApp } from './test-app';
import { until } from './until';

export interface EventListener {
  status: number;
  headers: IncomingMessage['headers'];
  measurements(takeId: string): MeasurementEvent[];
  added(): TakeAddedEvent[];
  /** Ids of the takes whose notes changed, in order. */
  notes(): string[];
  isOver(): boolean;
  close(): void;
}

/** Listens as a browser's EventSource does. */
export async function listenAs(
  test: TestApp,
  person: Person,
  takeIds: string[] = [],
): Promise<EventListener> {
  const { port } = test.server.address() as AddressInfo;
  const path = `${paths.events}?takes=${encodeURIComponent(takeIds.join(','))}`;
  const headers = { Cookie: await cookieOf(test, person) };
  const response = await new Promise<IncomingMessage>((resolve, reject) => {
    get({ host: '127.0.0.1', port, path, headers }, resolve).on('error', reject);
  });
  let text = '';
  let isOver = false;
  response.setEncoding('utf8');
  response.on('data', (chunk: string) => (text += chunk));
  response.on('close', () => (isOver = true));
  response.on('error', () => (isOver = true));
  const told = (name: string) =>
    text
      .split('\n\n')
      .slice(0, -1)
      .filter((event) => event.startsWith(`event: ${name}\n`))
      .map((event) => JSON.parse(event.split('\ndata: ')[1]) as unknown);
  await until(() => Promise.resolve(text !== '' || isOver));
  return {
    status: response.statusCode ?? 0,
    headers: response.headers,
    measurements: (takeId) =>
      told(eventNames.measurement)
        .map((event) => measurementEvent.parse(event))
        .filter((event) => event.takeId === takeId),
    added: () => told(eventNames.takeAdded) as TakeAddedEvent[],
    notes: () => (told(eventNames.notes) as NotesEvent[]).map(({ takeId }) => takeId),
    isOver: () => isOver,
    close: () => response.destroy(),
  };
}
