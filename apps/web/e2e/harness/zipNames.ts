const entrySignature = Buffer.from([0x50, 0x4b, 0x01, 0x02]);

/** What an archive says it holds: the names in its central directory (APPNOTE 4.3.12). */
export function zipNames(archive: Buffer): string[] {
  const names: string[] = [];
  for (let at = archive.indexOf(entrySignature); at >= 0; at = archive.indexOf(entrySignature, at + 46)) {
    const length = archive.readUInt16LE(at + 28);
    names.push(archive.toString('utf8', at + 46, at + 46 + length));
  }
  return names;
}
