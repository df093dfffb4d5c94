import { uploadLimits } from '@thudline/contracts';
import type { WavFacts } from '@thudline/dsp';
import { clock, number } from '../../lib/format';

/** "7.5 MB", "800 kB". */
export function sizeWords(sizeBytes: number): string {
  if (sizeBytes >= 999_500) return `${number(sizeBytes / 1e6, 1)} MB`;
  return sizeBytes === 0 ? 'no bytes' : `${Math.max(1, Math.round(sizeBytes / 1e3))} kB`;
}

export const limitWords = `${uploadLimits.maxFileBytes / 1024 ** 2} MB`;

/** "6.1 of 7.5 MB": both in the unit of the whole. */
export function sentWords(sentBytes: number, sizeBytes: number): string {
  if (sentBytes >= sizeBytes) return sizeWords(sizeBytes);
  return sizeBytes >= 999_500
    ? `${number(sentBytes / 1e6, 1)} of ${sizeWords(sizeBytes)}`
    : `${Math.round(sentBytes / 1e3)} of ${sizeWords(sizeBytes)}`;
}

/** "24-bit, 48 kHz, mono, 0:52". */
export function factsWords(facts: WavFacts): string {
  const bits = `${facts.validBits}-bit${facts.encoding === 'float' ? ' float' : ''}`;
  const words = [bits, rateWords(facts.sampleRateHz), channelWords(facts.channels), clock(facts.durationS)];
  return words.join(', ');
}

export const rateWords = (sampleRateHz: number) => `${Number((sampleRateHz / 1000).toFixed(3))} kHz`;

function channelWords(channels: number): string {
  if (channels === 1) return 'mono';
  return channels === 2 ? 'stereo' : `${channels} channels`;
}

/** "M4A, 0.9 MB": what can be said of a file that is not one of ours. */
export function foreignFileWords({ name, size }: { name: string; size: number }): string {
  const ending = /\.([A-Za-z0-9]{1,5})$/.exec(name)?.[1];
  return ending ? `${ending.toUpperCase()}, ${sizeWords(size)}` : sizeWords(size);
}

/** "This is …" → "this is …" behind a colon; names such as "RIFF" stay as they are. */
export const afterColon = (sentence: string) =>
  /^[A-Z][a-z' ]/.test(sentence) ? sentence[0].toLowerCase() + sentence.slice(1) : sentence;

/** "9 s left", "2 min left". */
export function shortTimeLeft(secondsLeft: number | null): string {
  if (secondsLeft === null) return '';
  if (secondsLeft <= 0) return 'sent';
  return secondsLeft < 100 ? `${Math.ceil(secondsLeft)} s left` : `${Math.ceil(secondsLeft / 60)} min left`;
}

/** "About 40 seconds left.": whole tens, so that the sentence does not flicker. */
export function aboutTimeLeft(secondsLeft: number | null): string {
  if (secondsLeft === null) return '';
  if (secondsLeft < 10) return 'A few seconds left.';
  if (secondsLeft <= 90) return `About ${Math.ceil(secondsLeft / 10) * 10} seconds left.`;
  return `About ${Math.ceil(secondsLeft / 60)} minutes left.`;
}

const countWords = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine'];
/** "Two"; figures from ten on. */
export const countWord = (count: number) => countWords[count] ?? String(count);
