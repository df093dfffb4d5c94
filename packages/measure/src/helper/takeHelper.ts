import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { Worker } from 'node:worker_threads';
import type { OverheadFacts, PairPart, PassedTrack, TakeSteps, TrackReading } from '@thudline/dsp/measuring';
import type { HelperAnswer, HelperTask, OpenTake } from './helperMessages';
import { unpackedHops, type PackedHops } from './packedHops';

/** A second thread that takes half of the work off a measurement. */
export interface TakeHelper {
  /** The steps of a take, done by the helper. */
  steps(take: OpenTake): TakeSteps;
  /** Lets go of the take; the helper waits for the next one and keeps no process alive. */
  rest(): void;
  /** Ends it in the middle of whatever it does. */
  end(): void;
}

type Answered = (answer: HelperAnswer) => void;

const file = join(__dirname, 'helperThread.js');
/** Room for young objects: it has few that live, and would otherwise take more the longer a take is. */
const youngMb = 8;
let resting: TakeHelper | null = null;

/** Starts one ahead of being asked for, so that it is ready sooner. */
export function startHelper(): void {
  takeHelper()?.rest();
}

/** @returns a helper, one that rests if there is one; null where the packages run from source, which no thread can load */
export function takeHelper(): TakeHelper | null {
  const rested = resting;
  resting = null;
  return rested ?? (existsSync(file) ? startedHelper() : null);
}

function startedHelper(): TakeHelper {
  const worker = new Worker(file, { resourceLimits: { maxYoungGenerationSizeMb: youngMb } });
  const waiting = new Map<number, Answered>();
  let lastId = 0;
  let broken: Error | null = null;
  const fail = (error: Error): void => {
    broken = error;
    if (resting === helper) resting = null;
    for (const [id, answered] of waiting) answered({ id, error });
    waiting.clear();
  };
  worker.on('message', (answer: HelperAnswer) => {
    const answered = waiting.get(answer.id);
    if (!('hops' in answer)) waiting.delete(answer.id);
    answered?.(answer);
  });
  worker.on('error', fail);
  worker.on('exit', () => fail(new Error('The helper thread ended.')));
  const ask = (task: HelperTask, answered: Answered): number => {
    lastId += 1;
    if (broken) answered({ id: lastId, error: broken });
    else waiting.set(lastId, answered);
    worker.postMessage({ ...task, id: lastId });
    return lastId;
  };
  const helper: TakeHelper = {
    steps(take) {
      worker.ref();
      worker.postMessage({ task: 'open', ...take, id: 0 });
      return {
        pass: (track, options) => remotePass(ask, worker, { task: 'pass', track, options }),
        pairPart: (request) => asked<PairPart>(ask, { task: 'pair-part', request }),
        overhead: (request) => asked<OverheadFacts>(ask, { task: 'overhead', request }),
      };
    },
    rest() {
      if (broken) return;
      worker.postMessage({ task: 'close', id: 0 });
      worker.unref();
      if (resting) helper.end();
      else resting = helper;
    },
    end() {
      void worker.terminate();
    },
  };
  return helper;
}

type Ask = (task: HelperTask, answered: Answered) => number;

function asked<Result>(ask: Ask, task: HelperTask): Promise<Result> {
  return new Promise((resolve, reject) => {
    ask(task, (answer) => {
      if ('error' in answer) reject(answer.error);
      else if ('result' in answer) resolve(answer.result as Result);
    });
  });
}

/** A pass that sends its blocks ahead of being asked for them. */
function remotePass(ask: Ask, worker: Worker, task: HelperTask): TrackReading {
  const blocks: PackedHops[] = [];
  let given: PackedHops | null = null;
  let arrived = (): void => undefined;
  let isOver = false;
  const id: { value: number } = { value: 0 };
  const passed = new Promise<PassedTrack>((resolve, reject) => {
    id.value = ask(task, (answer) => {
      if ('hops' in answer) blocks.push(answer.hops);
      else isOver = true;
      if ('error' in answer) reject(answer.error);
      if ('result' in answer) resolve(answer.result as PassedTrack);
      arrived();
    });
  });
  // Told to whoever asks for the next block.
  passed.catch(() => undefined);
  return {
    async next() {
      if (given) {
        worker.postMessage({ task: 'taken', id: id.value, room: given.buffer }, [given.buffer]);
        given = null;
      }
      while (blocks.length === 0 && !isOver) {
        await new Promise<void>((resolve) => {
          arrived = resolve;
        });
      }
      given = blocks.shift() ?? null;
      if (!given) {
        await passed;
        return null;
      }
      return unpackedHops(given);
    },
    result: () => passed,
    close: () => Promise.resolve(),
  };
}
