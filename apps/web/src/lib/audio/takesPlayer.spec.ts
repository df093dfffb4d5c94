import { TakesPlayer } from './takesPlayer';

/** The least of Web Audio that the player touches; sources remember where they began and whether they run. */
const sources: FakeSource[] = [];
const fades: FakeNode[] = [];

class FakeParam {
  value: number;
  constructor(value = 0) {
    this.value = value;
  }
  setValueAtTime() {}
  cancelScheduledValues() {}
  linearRampToValueAtTime(to: number) {
    this.value = to;
  }
}
class FakeNode {
  gain: FakeParam;
  constructor(_context?: unknown, { gain = 1 }: { gain?: number } = {}) {
    this.gain = new FakeParam(gain);
    if (_context) fades.push(this);
  }
  connect(to: unknown) {
    return to;
  }
}
class FakeSource extends FakeNode {
  loops: boolean;
  begun: { atS: number; offsetS: number } | null = null;
  onended: () => void = () => undefined;
  constructor(_context?: unknown, { loop = false }: { loop?: boolean } = {}) {
    super();
    this.loops = loop;
    sources.push(this);
  }
  start(atS: number, offsetS: number) {
    this.begun = { atS, offsetS };
  }
  stop() {
    this.begun = null;
  }
}
class FakeContext {
  currentTime = 10;
  destination = new FakeNode();
  resume = () => Promise.resolve();
  close = () => Promise.resolve();
  createGain = () => new FakeNode();
}

const take = { sampleRateHz: 48_000, samples: new Float32Array(48_000), gainDb: 0, matchDb: 0 };
let ended: jest.Mock;
const player = (selected: number, loops = false) =>
  new TakesPlayer({ takes: [take, take], zerosS: [3.2, 0.5], selected, loops, onEnded: ended });
/** The second gain of each take is its fade. */
const heard = () => fades.slice(-4).flatMap((node, i) => (i % 2 === 1 ? node.gain.value : []));

beforeEach(() => {
  sources.length = 0;
  fades.length = 0;
  ended = jest.fn();
  Object.assign(globalThis, {
    AudioContext: FakeContext,
    GainNode: FakeNode,
    AudioBufferSourceNode: FakeSource,
    AudioBuffer: class {
      copyToChannel() {}
    },
  });
});

describe('two takes playing in step', () => {
  it('begin together, each from its own place of the common time', async () => {
    await player(1).play(2);
    const [first, second] = sources.map(({ begun }) => begun!);
    expect(first.atS).toBe(second.atS);
    expect([first.offsetS, second.offsetS]).toEqual([5.2, 2.5]);
  });

  it('let the one that hasn’t begun by then join in later', async () => {
    await player(0).play(-1);
    const [first, second] = sources.map(({ begun }) => begun!);
    expect(first.offsetS).toBeCloseTo(2.2, 9);
    expect(second.offsetS).toBe(0);
    expect(second.atS - first.atS).toBeCloseTo(0.5, 9);
  });

  it('let only the chosen one be heard, and start nothing anew for another', async () => {
    const both = player(1);
    await both.play(0);
    expect(heard()).toEqual([0, 1]);
    both.select(0);
    expect(heard()).toEqual([1, 0]);
    expect(sources).toHaveLength(2);
  });

  it('start with the one that was chosen while nothing played', async () => {
    const both = player(1);
    both.select(0);
    await both.play(0);
    expect(heard()).toEqual([1, 0]);
  });

  it('have ended when the longer one has', async () => {
    await player(0).play(0);
    sources[0].onended();
    expect(ended).not.toHaveBeenCalled();
    sources[1].onended();
    expect(ended).toHaveBeenCalledTimes(1);
  });

  it('begin again together where they loop', async () => {
    await player(0, true).play(0);
    expect(sources.map(({ loops }) => loops)).toEqual([true, true]);
  });

  it('are silent after a stop, also one that came before the browser allowed sound', async () => {
    const both = player(0);
    const started = both.play(0);
    both.stop();
    await started;
    expect(sources).toHaveLength(0);
    await both.play(0);
    both.stop();
    expect(sources.map(({ begun }) => begun)).toEqual([null, null]);
    expect(ended).not.toHaveBeenCalled();
  });
});
