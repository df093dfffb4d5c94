/** The same stretch with its sound `samples` later (earlier where negative); what is moved in is silence. */
export function delayedSamples(samples: Float32Array, by: number): Float32Array {
  const moved = new Float32Array(samples.length);
  if (by >= 0) moved.set(samples.subarray(0, samples.length - by), by);
  else moved.set(samples.subarray(-by));
  return moved;
}
