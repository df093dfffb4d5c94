import { paths, sameFilesResponse } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';
import { fileHash } from '../fileHash';
import type { ReadyFile } from '../pickedFile';
import type { FileSentBefore } from '../sameFilesWords';

/** Which of these files the player sent before. What can't be found out is not told: it only helps, it never holds up. */
export function useSameFiles(files: readonly ReadyFile[]): FileSentBefore[] {
  const hashes = useHashes(files);
  const known = files.flatMap(({ id }) => hashes[id] ?? []);
  const path = `${paths.sameFiles}?sha256=${[...new Set(known)].join(',')}`;
  const { data } = useSWR(known.length > 0 ? path : null, (asked: string) =>
    requestJson(asked, sameFilesResponse),
  );
  return files.flatMap(({ id, file }) => {
    const found = data?.items.find(({ sha256 }) => sha256 === hashes[id]);
    return found ? [{ name: file.name, take: found.take }] : [];
  });
}

/** Each file is hashed once, by its id; null where that can't be done. */
function useHashes(files: readonly ReadyFile[]): Record<string, string | null> {
  const started = useRef(new Set<string>());
  const [hashes, setHashes] = useState<Record<string, string | null>>({});
  useEffect(() => {
    for (const { id, file } of files) {
      if (started.current.has(id)) continue;
      started.current.add(id);
      void fileHash(file).then((hash) => setHashes((now) => ({ ...now, [id]: hash })));
    }
  }, [files]);
  return hashes;
}
