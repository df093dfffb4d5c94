import { parentPort } from 'node:worker_threads';
import { createTakeSteps, type TakeSteps } from '@thudline/dsp/measuring';
import { withOpenFiles } from '../openFiles';
import { chosenTracks } from '../trackChoice';
import { blocksAhead } from './blocksAhead';
import type { HelperAnswer, HelperRequest, OpenTake } from './helperMessages';
import { packedHops } from './packedHops';

/** The other end of `takeHelper.ts`, in a worker thread: does steps of the take it was told to open. */
interface OpenedTake {
  readonly steps: Promise<TakeSteps>;
  readonly close: () => void;
}

let take: OpenedTake | null = null;
/** By the id of a pass: lets it go on by one more block. */
const takenOf = new Map<number, (room: ArrayBuffer) => void>();

parentPort?.on('message', (request: HelperRequest) => {
  const { id } = request;
  done(request).then(
    (result) => {
      if (result !== undefined) tell({ id, result });
    },
    (error: unknown) => tell({ id, error: error instanceof Error ? error : new Error(String(error)) }),
  );
});

function tell(answer: HelperAnswer, transfer: ArrayBuffer[] = []): void {
  parentPort?.postMessage(answer, transfer);
}

/** @returns undefined where nobody waits for an answer */
async function done(
  request: HelperRequest,
): Promise<Extract<HelperAnswer, { result: unknown }>['result'] | undefined> {
  switch (request.task) {
    case 'open':
      take?.close();
      take = opened(request);
      return undefined;
    case 'close':
      take?.close();
      take = null;
      return null;
    case 'taken':
      takenOf.get(request.id)?.(request.room);
      return undefined;
    case 'pass':
      return pass(request);
    case 'pair-part':
      return (await steps()).pairPart(request.request, () => undefined);
    case 'overhead':
      return (await steps()).overhead(request.request);
  }
}

function steps(): Promise<TakeSteps> {
  if (!take) throw new Error('The helper was asked for a step of no take.');
  return take.steps;
}

function opened({ paths, tracks }: OpenTake): OpenedTake {
  let close = (): void => undefined;
  const closed = new Promise<void>((resolve) => {
    close = resolve;
  });
  const opening = new Promise<TakeSteps>((resolve, reject) => {
    withOpenFiles(paths, async (files) => {
      resolve(createTakeSteps(chosenTracks(files, tracks).map(({ source }) => source)));
      await closed;
    }).catch(reject);
  });
  // Whoever asks for a step is told.
  opening.catch(() => undefined);
  return { steps: opening, close };
}

async function pass({ id, track, options }: Extract<HelperRequest, { task: 'pass' }>) {
  let ahead = 0;
  let goOn = (): void => undefined;
  const rooms: ArrayBuffer[] = [];
  takenOf.set(id, (room) => {
    rooms.push(room);
    ahead -= 1;
    goOn();
  });
  const reading = (await steps()).pass(track, options);
  try {
    for (let hops = await reading.next(); hops; hops = await reading.next()) {
      const packed = packedHops(hops, rooms.pop());
      tell({ id, hops: packed }, [packed.buffer]);
      ahead += 1;
      if (ahead >= blocksAhead) {
        await new Promise<void>((resolve) => {
          goOn = resolve;
        });
      }
    }
    return await reading.result();
  } finally {
    takenOf.delete(id);
    await reading.close();
  }
}
