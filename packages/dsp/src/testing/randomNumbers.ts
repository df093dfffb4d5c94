import { seededRandom } from '../measurements/comparing/seededRandom';

/** Uniform numbers from −1 to 1, one a call, the same for the same seed. */
export function randomNumbers(seed: number): () => number {
  const uniform = seededRandom(seed);
  return () => uniform() * 2 - 1;
}
