/** A key is never used twice: ids are new for every upload. */
export const objectKeys = {
  takeFile: (takeId: string, fileId: string) => `takes/${takeId}/${fileId}.wav`,
} as const;
