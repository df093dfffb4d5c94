let handedOver: File[] = [];

/** Files dropped on the list of takes wait here while the upload page opens: history state can't hold them safely. */
export function handOverFiles(files: readonly File[]) {
  handedOver = [...files];
}

/** @returns what waits, once */
export function takeHandedOverFiles(): File[] {
  const files = handedOver;
  handedOver = [];
  return files;
}
