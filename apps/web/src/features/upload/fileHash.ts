/** The browser takes a file into memory as a whole to hash it; most takes are far smaller. Common practice, no source. */
export const mostHashedBytes = 64 * 1024 * 1024;

/** @returns SHA-256 in hexadecimal; null where the file is too large, can't be read, or the browser can't hash (no HTTPS) */
export async function fileHash(file: File): Promise<string | null> {
  const { subtle } = globalThis.crypto ?? {};
  if (!subtle || file.size > mostHashedBytes) return null;
  try {
    const hash = new Uint8Array(await subtle.digest('SHA-256', await file.arrayBuffer()));
    return Array.from(hash, (byte) => byte.toString(16).padStart(2, '0')).join('');
  } catch {
    return null;
  }
}
