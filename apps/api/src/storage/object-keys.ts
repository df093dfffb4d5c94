interface MeasuredIn {
  takeId: string;
  measurementId: string;
  attempt: number;
}

interface AddedIn {
  takeId: string;
  addedFileId: string;
  attempt: number;
}

interface ExportedIn {
  ownerId: string;
  exportId: string;
  attempt: number;
}

/** A key is never used twice: ids are new for every upload. */
export const objectKeys = {
  /** Each attempt writes its own. */
  export: ({ ownerId, exportId, attempt }: ExportedIn) => `exports/${ownerId}/${exportId}-${attempt}.zip`,
  /** Every archive there is of an account. */
  exports: (ownerId: string) => `exports/${ownerId}/`,
  /** Each attempt writes its own. */
  addedFile: ({ takeId, addedFileId, attempt }: AddedIn) =>
    `takes/${takeId}/added/${addedFileId}-${attempt}.wav`,
  /** Everything there is of a take. */
  take: (takeId: string) => `takes/${takeId}/`,
  /** Each attempt writes its own, so that a slower worker never writes over what a report stands on. */
  peaks: ({ takeId, measurementId, attempt }: MeasuredIn, trackId: string) =>
    `takes/${takeId}/measurements/${measurementId}-${attempt}/${trackId}.peaks`,
  photo: (photoId: string) => `photos/${photoId}.jpg`,
  takeFile: (takeId: string, fileId: string) => `takes/${takeId}/${fileId}.wav`,
} as const;
