import { setTimeout as delay } from 'node:timers/promises';

const pauseMs = 100;

/**
 * Asks until the answer is yes; what the question throws is a no.
 *
 * @returns milliseconds it took
 * @throws {Error} it never was within `withinMs`
 */
export async function waitUntil(
  what: string,
  question: () => Promise<boolean>,
  withinMs: number,
): Promise<number> {
  const start = Date.now();
  for (;;) {
    if (await question().catch(() => false)) return Date.now() - start;
    if (Date.now() - start > withinMs) throw new Error(`${what}: not within ${withinMs / 1000} s`);
    await delay(pauseMs);
  }
}
