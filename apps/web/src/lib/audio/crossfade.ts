/**
 * How long a switch between two takes lasts: long enough not to click, short enough to sound at once. Common practice, no
 * source.
 */
export const crossfadeS = 0.015;

/**
 * What is heard where one signal is exchanged for another: the two gains always add up to one, so nothing can get louder
 * than the louder of the two, and no step between samples can be larger than theirs by more than the fade's own slope.
 *
 * @param options.at - index of the first sample of the fade
 * @param options.frames - length of the fade
 * @returns a signal as long as the shorter one
 */
export function crossfade(
  from: ArrayLike<number>,
  to: ArrayLike<number>,
  { at, frames }: { at: number; frames: number },
): Float32Array {
  return Float32Array.from({ length: Math.min(from.length, to.length) }, (_, i) => {
    const share = Math.min(1, Math.max(0, (i - at) / frames));
    return from[i] * (1 - share) + to[i] * share;
  });
}

/** Moves a gain in a straight line from where it is, as {@link crossfade} does; also in the middle of another fade. */
export function fadeTo(context: BaseAudioContext, param: AudioParam, to: number): void {
  const now = context.currentTime;
  param.cancelScheduledValues(now);
  param.setValueAtTime(param.value, now);
  param.linearRampToValueAtTime(to, now + crossfadeS);
}
