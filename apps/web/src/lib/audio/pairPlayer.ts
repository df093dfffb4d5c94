import { createChoiceMixer, type ChoiceMixer } from './choiceMixer';
import { loopEnds } from './loopBuffer';
import type { MixBranch } from './mixPlan';

export interface LoopExcerpt {
  sampleRateHz: number;
  kick: Float32Array;
  overhead: Float32Array;
}

/** Loops start quiet: from about −14 dB to full in this time. Common practice for protecting ears, no source. */
const quietStart = { gain: 0.2, riseS: 2.5 };
const stopS = 0.02;

/** Plays one thing at a time, a hit on repeat or the whole take, through every choice at once. */
export class PairPlayer {
  private context: AudioContext | null = null;
  private mixer: ChoiceMixer | null = null;
  private halt: (() => void) | null = null;
  private mediaSource: MediaElementAudioSourceNode | null = null;
  /** Raised by every start and stop: whoever waited meanwhile sees that it is no longer wanted. */
  private run = 0;
  /** The run that plays the take, the last one that did. */
  private takeRun = 0;

  constructor(
    /** The whole take, two channels; whoever draws it may seek it. */
    private readonly media: HTMLAudioElement,
    private plan: readonly MixBranch[],
    private selected: number,
  ) {}

  async playLoop(excerpt: LoopExcerpt): Promise<void> {
    const started = await this.start();
    if (!started) return;
    const { context, mixer } = started;
    const buffer = new AudioBuffer({
      numberOfChannels: 2,
      length: excerpt.kick.length,
      sampleRate: excerpt.sampleRateHz,
    });
    buffer.copyToChannel(loopEnds(excerpt.kick, excerpt.sampleRateHz), 0);
    buffer.copyToChannel(loopEnds(excerpt.overhead, excerpt.sampleRateHz), 1);
    const source = new AudioBufferSourceNode(context, { buffer, loop: true });
    source.connect(mixer.input);
    source.start();
    this.halt = () => source.stop(context.currentTime + stopS);
  }

  /** Goes on from where the take stands. */
  async playTake(): Promise<void> {
    const started = await this.start();
    if (!started) return;
    const { context, mixer, run } = started;
    const source = (this.mediaSource ??= context.createMediaElementSource(this.media));
    source.connect(mixer.input);
    this.takeRun = run;
    this.halt = () =>
      this.afterFade(() => {
        source.disconnect(mixer.input);
        // Started again meanwhile, the take goes on.
        if (this.takeRun === run) this.media.pause();
      });
    try {
      await this.media.play();
    } catch (error) {
      // A stop while it still loads makes the browser say it was aborted: that is what was asked for.
      if (run === this.run) throw error;
    }
  }

  select(index: number) {
    this.selected = index;
    this.mixer?.select(index);
  }

  update(plan: readonly MixBranch[]) {
    this.plan = plan;
    this.mixer?.update(plan);
  }

  stop() {
    this.run++;
    const { context, mixer, halt } = this;
    this.mixer = null;
    this.halt = null;
    if (!context || !mixer || !halt) return;
    fadeOut(context, mixer);
    halt();
    this.afterFade(() => mixer.dispose());
  }

  /** Ends for good, after the last fade. */
  close() {
    this.stop();
    const { context } = this;
    this.context = null;
    this.mediaSource = null;
    this.afterFade(() => {
      this.media.pause();
      void context?.close();
    });
  }

  private afterFade(act: () => void) {
    setTimeout(act, stopS * 2000);
  }

  private async start() {
    this.stop();
    const run = ++this.run;
    const context = (this.context ??= new AudioContext({ latencyHint: 'interactive' }));
    await context.resume();
    if (run !== this.run) return null;
    const mixer = createChoiceMixer(context, this.plan, this.selected);
    const now = context.currentTime;
    const level = mixer.output.gain;
    level.setValueAtTime(0, now);
    level.linearRampToValueAtTime(quietStart.gain, now + 0.03);
    level.linearRampToValueAtTime(1, now + quietStart.riseS);
    mixer.output.connect(context.destination);
    this.mixer = mixer;
    return { context, mixer, run };
  }
}

function fadeOut(context: AudioContext, mixer: ChoiceMixer) {
  const level = mixer.output.gain;
  const now = context.currentTime;
  level.cancelScheduledValues(now);
  level.setValueAtTime(level.value, now);
  level.linearRampToValueAtTime(0, now + stopS);
}
