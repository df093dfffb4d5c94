const endSignature = Buffer.from([0x50, 0x4b, 0x05, 0x06]);

/** What an archive says it holds: the names in its central directory (APPNOTE 4.3.12 and 4.3.16). */
export function zipNames(archive: Buffer): string[] {
  const end = archive.lastIndexOf(endSignature);
  if (end < 0) throw new Error('This is no whole archive.');
  const names: string[] = [];
  let at = archive.readUInt32LE(end + 16);
  for (let left = archive.readUInt16LE(end + 10); left > 0; left -= 1) {
    const [nameBytes, extraBytes, commentBytes] = [28, 30, 32].map((offset) =>
      archive.readUInt16LE(at + offset),
    );
    names.push(archive.toString('utf8', at + 46, at + 46 + nameBytes!));
    at += 46 + nameBytes! + extraBytes! + commentBytes!;
  }
  return names;
}
