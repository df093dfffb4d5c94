/** A file that is about to be sent, and the take it is in already. */
export interface FileSentBefore {
  name: string;
  take: { id: string; number: number; title: string };
}

const takeWords = ({ number, title }: FileSentBefore['take']) =>
  title ? `take ${number}, “${title}”` : `take ${number}`;

/** "You sent these files before: they are take 12, “felt beater”." One sentence a take. */
export function sameFilesWords(
  found: readonly FileSentBefore[],
): { takeId: string; count: number; strong: string; rest: string }[] {
  const takes = new Map<string, FileSentBefore[]>();
  for (const file of found) takes.set(file.take.id, [...(takes.get(file.take.id) ?? []), file]);
  return [...takes.values()].map((files) => {
    const [{ take, name }] = files;
    const said =
      files.length === 1
        ? { strong: `${name} was sent before:`, rest: `it is in ${takeWords(take)}.` }
        : { strong: 'You sent these files before:', rest: `they are ${takeWords(take)}.` };
    return { takeId: take.id, count: files.length, ...said };
  });
}
