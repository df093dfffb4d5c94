import type { Choice } from '@thudline/dsp';

/** "overhead flipped, 1.600 ms earlier, 5.70 dB louder", with every part that changes something. */
export function choiceWords({ flipped, shiftMs, gainDb }: Choice): string {
  const parts = [
    flipped ? 'overhead flipped' : 'overhead not flipped',
    shiftMs !== 0 && `${Math.abs(shiftMs).toFixed(3)} ms ${shiftMs > 0 ? 'earlier' : 'later'}`,
    gainDb !== 0 && `${Math.abs(gainDb).toFixed(2)} dB ${gainDb > 0 ? 'louder' : 'quieter'}`,
  ];
  return parts.filter(Boolean).join(', ');
}

/** How an added file was made, for its comment: one or two sentences. */
export function addedWords(choice: Choice, levelDb: number): string {
  const turnedDown =
    levelDb < 0 ? ` Turned down ${(-levelDb).toFixed(2)} dB, so that no peak goes beyond -1 dBTP.` : '';
  return `Kick and overhead added: ${choiceWords(choice)}.${turnedDown}`;
}

/** One line of coding history (EBU R 98), what follows `T=` free text. */
export function addedHistory(
  choice: Choice,
  { sampleRateHz, levelDb }: { sampleRateHz: number; levelDb: number },
): string {
  const polarity = choice.flipped ? -1 : 1;
  const made = `kick+overhead, polarity ${polarity}, shift ${choice.shiftMs.toFixed(3)} ms, gain ${choice.gainDb.toFixed(2)} dB, level ${levelDb.toFixed(2)} dB`;
  return `A=PCM,F=${sampleRateHz},W=24,M=mono,T=Thudline; ${made}`;
}
