import { expect, type Page } from '@playwright/test';

interface Tap {
  blocks: Float32Array[];
  sampleRateHz: number;
  /** Length of what plays on repeat; 0 where nothing does. */
  loopS: number;
}
declare global {
  interface Window {
    soundTap: Tap;
  }
}

const blockFrames = 4096;
/** Fades of a changed choice have ended by then. */
const skippedBlocks = 8;
/** More than three seconds: a hit on repeat comes by at least once, whole. */
const heardBlocks = 40;

/** Before the page is opened: keeps whatever reaches the loudspeakers. */
export async function tapSound(page: Page): Promise<void> {
  await page.addInitScript((frames) => {
    type Connect = (this: AudioNode, ...to: unknown[]) => AudioNode;
    const connect = Reflect.get(AudioNode.prototype, 'connect') as Connect;
    window.soundTap = { blocks: [], sampleRateHz: 0, loopS: 0 };
    const tap = (node: AudioNode, context: AudioContext) => {
      window.soundTap.sampleRateHz = context.sampleRate;
      // A worklet would need a file of its own; this old node is enough to listen.
      const ear = context.createScriptProcessor(frames, 1, 1);
      ear.onaudioprocess = ({ inputBuffer }) =>
        window.soundTap.blocks.push(Float32Array.from(inputBuffer.getChannelData(0)));
      connect.call(node, ear);
      // It is only run when it leads somewhere; it gives out silence.
      connect.call(ear, context.destination);
    };
    const tapped: Connect = function (...to) {
      if (to[0] === this.context.destination && this.context instanceof AudioContext) tap(this, this.context);
      return connect.apply(this, to);
    };
    Reflect.set(AudioNode.prototype, 'connect', tapped);
    type Start = (this: AudioBufferSourceNode, ...when: unknown[]) => void;
    const start = Reflect.get(AudioBufferSourceNode.prototype, 'start') as Start;
    const watched: Start = function (...when) {
      window.soundTap.loopS = this.loop ? (this.buffer?.duration ?? 0) : 0;
      start.apply(this, when);
    };
    Reflect.set(AudioBufferSourceNode.prototype, 'start', watched);
  }, blockFrames);
}

export interface Heard {
  /** Mean square, dB of full scale. */
  levelDbfs: number;
  /** The same of what lies below 150 Hz. */
  lowDbfs: number;
}

/**
 * Listens to a few seconds from now on, leaving out the fade of what was just changed. Of what plays on repeat whole rounds
 * are judged, so that it doesn't matter where in a round the listening began.
 */
export async function hear(page: Page): Promise<Heard> {
  await page.evaluate(() => {
    window.soundTap.blocks = [];
  });
  await expect
    .poll(() => page.evaluate(() => window.soundTap.blocks.length), 'sound reaches the loudspeakers')
    .toBeGreaterThan(skippedBlocks + heardBlocks);
  return page.evaluate((skip) => {
    const { blocks, sampleRateHz, loopS } = window.soundTap;
    const heard = blocks.slice(skip).flatMap((block) => [...block]);
    const roundFrames = Math.round(loopS * sampleRateHz);
    const rounds = roundFrames > 0 ? Math.floor(heard.length / roundFrames) : 0;
    const frames = rounds > 0 ? rounds * roundFrames : heard.length;
    // Two one-pole low-passes at 150 Hz: gentle, but the same for both things compared.
    const keep = 1 - Math.exp((-2 * Math.PI * 150) / sampleRateHz);
    let [all, low, once, twice] = [0, 0, 0, 0];
    for (const sample of heard.slice(0, frames)) {
      once += keep * (sample - once);
      twice += keep * (once - twice);
      all += sample * sample;
      low += twice * twice;
    }
    const decibels = (energy: number) => 10 * Math.log10(energy / frames + 1e-15);
    return { levelDbfs: decibels(all), lowDbfs: decibels(low) };
  }, skippedBlocks);
}
