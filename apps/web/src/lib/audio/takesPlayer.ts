import { fadeTo } from './crossfade';
import { loopEnds } from './loopBuffer';
import type { HeardTake } from './matchedTakes';

/** It starts quiet: from about −14 dB to full in this time. Common practice for protecting ears, no source. */
const quietStart = { gain: 0.2, fadeS: 0.03, riseS: 2.5 };
/** Both takes are to begin at the same sample: time enough to start them. */
const leadS = 0.02;
const stopS = 0.02;

interface Track {
  source: AudioBufferSourceNode;
  fade: GainNode;
}

export interface TakesPlaying {
  takes: readonly HeardTake[];
  /** Where the common time is 0 in each take, such as its first kick hit. */
  zerosS: readonly number[];
  selected: number;
  /** All begin again together; they are of one length, then. */
  loops?: boolean;
  onEnded: () => void;
}

/** Takes that play in step, one of them heard: choosing another crossfades at the same musical moment. */
export class TakesPlayer {
  private context: AudioContext | null = null;
  private tracks: readonly Track[] = [];
  private output: GainNode | null = null;
  private startedAt = { contextS: 0, fromS: 0 };
  /** Raised by every start and stop: whoever waited meanwhile sees that it is no longer wanted. */
  private run = 0;

  private selected: number;

  constructor(private readonly playing: TakesPlaying) {
    this.selected = playing.selected;
  }

  /** @param fromS - on the common time; a take that hasn't begun by then joins in later */
  async play(fromS: number): Promise<void> {
    this.stop();
    const run = ++this.run;
    const context = (this.context ??= new AudioContext({ latencyHint: 'interactive' }));
    await context.resume();
    if (run !== this.run) return;
    const beginS = context.currentTime + leadS;
    const output = quietOutput(context, beginS);
    const { takes, zerosS, loops = false, onEnded } = this.playing;
    this.tracks = takes.map((take, i) => {
      const track = createTrack(context, take, { on: i === this.selected, loops });
      track.fade.connect(output);
      const offsetS = fromS + zerosS[i];
      track.source.start(beginS + Math.max(0, -offsetS), Math.max(0, offsetS));
      return track;
    });
    this.output = output;
    this.startedAt = { contextS: beginS, fromS };
    let left = this.tracks.length;
    for (const { source } of this.tracks) {
      source.onended = () => {
        left--;
        if (left === 0 && run === this.run) onEnded();
      };
    }
  }

  select(index: number): void {
    this.selected = index;
    const { context } = this;
    if (context) this.tracks.forEach(({ fade }, i) => fadeTo(context, fade.gain, i === index ? 1 : 0));
  }

  /** Where it plays, on the common time. */
  positionS(): number {
    const { contextS, fromS } = this.startedAt;
    return fromS + Math.max(0, (this.context?.currentTime ?? contextS) - contextS);
  }

  stop(): void {
    this.run++;
    const { context, output, tracks } = this;
    this.output = null;
    this.tracks = [];
    if (!context || !output) return;
    const now = context.currentTime;
    output.gain.cancelScheduledValues(now);
    output.gain.setValueAtTime(output.gain.value, now);
    output.gain.linearRampToValueAtTime(0, now + stopS);
    for (const { source } of tracks) source.stop(now + stopS);
  }

  /** Ends for good, after the last fade. */
  close(): void {
    this.stop();
    const { context } = this;
    this.context = null;
    setTimeout(() => void context?.close(), stopS * 2000);
  }
}

function quietOutput(context: AudioContext, beginS: number): GainNode {
  const output = context.createGain();
  output.gain.setValueAtTime(0, context.currentTime);
  output.gain.setValueAtTime(0, beginS);
  output.gain.linearRampToValueAtTime(quietStart.gain, beginS + quietStart.fadeS);
  output.gain.linearRampToValueAtTime(1, beginS + quietStart.riseS);
  output.connect(context.destination);
  return output;
}

function createTrack(
  context: AudioContext,
  { samples, sampleRateHz, gainDb }: HeardTake,
  { on, loops }: { on: boolean; loops: boolean },
): Track {
  const buffer = new AudioBuffer({
    numberOfChannels: 1,
    length: Math.max(1, samples.length),
    sampleRate: sampleRateHz,
  });
  buffer.copyToChannel(loops ? loopEnds(samples, sampleRateHz) : samples, 0);
  const source = new AudioBufferSourceNode(context, { buffer, loop: loops });
  const level = new GainNode(context, { gain: 10 ** (gainDb / 20) });
  const fade = new GainNode(context, { gain: on ? 1 : 0 });
  source.connect(level).connect(fade);
  return { source, fade };
}
