/** A key is never used twice: ids are new for every upload. */
export const objectKeys = {
  /** Everything there is of a take. */
  take: (takeId: string) => `takes/${takeId}/`,
  takeFile: (takeId: string, fileId: string) => `takes/${takeId}/${fileId}.wav`,
} as const;
