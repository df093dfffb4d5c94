import { PairPlayer } from './pairPlayer';

/** The least of Web Audio that the player touches; sources remember whether they run. */
const sources: FakeSource[] = [];
let allowSound: () => void = () => undefined;

class FakeParam {
  value = 0;
  setValueAtTime() {}
  linearRampToValueAtTime() {}
  cancelScheduledValues() {}
}
class FakeNode {
  gain = new FakeParam();
  delayTime = new FakeParam();
  connect(to: unknown) {
    return to;
  }
  disconnect() {}
}
class FakeSource extends FakeNode {
  runs = false;
  constructor() {
    super();
    sources.push(this);
  }
  start() {
    this.runs = true;
  }
  stop() {
    this.runs = false;
  }
}
class FakeContext {
  currentTime = 0;
  destination = new FakeNode();
  resume() {
    return new Promise<void>((resolve) => {
      allowSound = resolve;
    });
  }
  close() {
    return Promise.resolve();
  }
  createChannelSplitter = () => new FakeNode();
  createGain = () => new FakeNode();
  createMediaElementSource = () => new FakeNode();
}

const excerpt = { sampleRateHz: 48_000, kick: new Float32Array(4800), overhead: new Float32Array(4800) };
const branch = { kickDelayS: 0, overheadDelayS: 0, kickGain: 1, overheadGain: 1 };
const player = (media: Partial<HTMLAudioElement> = {}) =>
  new PairPlayer(media as HTMLAudioElement, [branch], 0);

beforeEach(() => {
  jest.useFakeTimers();
  sources.length = 0;
  Object.assign(globalThis, {
    AudioContext: FakeContext,
    GainNode: FakeNode,
    DelayNode: FakeNode,
    AudioBufferSourceNode: FakeSource,
    AudioBuffer: class {
      copyToChannel() {}
    },
  });
});
afterEach(() => jest.useRealTimers());

describe('the player of a sheet', () => {
  it('starts nothing when it was stopped before the browser allowed sound', async () => {
    const sound = player();
    const started = sound.playLoop(excerpt);
    sound.stop();
    allowSound();
    await started;
    expect(sources).toHaveLength(0);
  });

  it('plays only what was asked for last', async () => {
    const sound = player();
    const first = sound.playLoop(excerpt);
    const allowFirst = allowSound;
    const second = sound.playLoop(excerpt);
    allowSound();
    allowFirst();
    await Promise.all([first, second]);
    expect(sources.filter(({ runs }) => runs)).toHaveLength(1);
    sound.stop();
    expect(sources.some(({ runs }) => runs)).toBe(false);
  });

  it('takes a stop while the take still loads for what it is, not for a failure', async () => {
    let abort: (error: Error) => void = () => undefined;
    const pause = jest.fn();
    const sound = player({ pause, play: () => new Promise((_resolve, reject) => (abort = reject)) });
    const started = sound.playTake();
    allowSound();
    await jest.advanceTimersByTimeAsync(0);
    sound.stop();
    abort(new Error('aborted by pause'));
    await expect(started).resolves.toBeUndefined();
    jest.runAllTimers();
    expect(pause).toHaveBeenCalledTimes(1);
  });

  it('tells a real failure to play', async () => {
    const sound = player({ play: () => Promise.reject(new Error('not allowed')) });
    const started = sound.playTake();
    allowSound();
    await expect(started).rejects.toThrow('not allowed');
  });
});
