import { useEffect, useRef } from 'react';
import type { FileReading, PickedFile } from '../../upload/pickedFile';
import { readPickedFile } from '../../upload/readPickedFile';

/** Looks at each picked file once, in the browser. */
export function useReadFiles(
  files: readonly PickedFile[],
  onRead: (id: string, reading: FileReading) => void,
) {
  const started = useRef(new Set<string>());
  useEffect(() => {
    for (const { id, file } of files) {
      if (started.current.has(id)) continue;
      started.current.add(id);
      void readPickedFile(file).then((reading) => onRead(id, reading));
    }
  }, [files, onRead]);
}
