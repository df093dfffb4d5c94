import type { ListNotesResponse, NextItem, NoteResponse } from '@thudline/contracts';

export interface AskedItem {
  item: NextItem;
  from: NoteResponse['from'];
}

/** Everything that notes ask for before the next take, in the order it was asked. */
export function askedItems({ items }: Pick<ListNotesResponse, 'items'>): AskedItem[] {
  const notes = items.flatMap((thread): NoteResponse[] => [thread, ...thread.answers]);
  return notes.flatMap(({ nextItems, from }) => nextItems.map((item) => ({ item, from })));
}
