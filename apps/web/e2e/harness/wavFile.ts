/** A recording as Playwright hands it to a file field. */
export const wavFile = (name: string, bytes: Uint8Array) => ({
  name,
  mimeType: 'audio/wav',
  buffer: Buffer.from(bytes),
});
