/** Leaves the processor to what is waited for. */
const pauseMs = 20;

/** Looks again and again until there is something to see; jest's own time limit ends it. */
export async function until<T>(look: () => Promise<T | null | false>): Promise<T> {
  for (;;) {
    const seen = await look();
    if (seen) return seen;
    await new Promise((resolve) => setTimeout(resolve, pauseMs));
  }
}
