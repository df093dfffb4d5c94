/** Of Node when a service isn't reached, and of PostgreSQL when it goes down or comes up. */
const codes = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
  'ETIMEDOUT',
  '57P01',
  '57P02',
  '57P03',
  '08006',
]);

/**
 * pg-boss tells the database how a job ended without waiting for the answer, so that where the database is away nobody hears
 * of it but Node itself, which would end the process. Nothing is lost by that word: sweeps find what waits without a job, and a
 * mail's job expires and runs again.
 *
 * @returns whether a rejection that nobody caught is such a word
 */
export function isLostWord(reason: unknown): boolean {
  if (!(reason instanceof Error)) return false;
  const { code } = reason as { code?: unknown };
  return (
    reason.stack?.includes('pg-boss') === true &&
    ((typeof code === 'string' && codes.has(code)) || /^Connection (terminated|ended)/.test(reason.message))
  );
}
