import { useNotesBench } from '../notesBench';

/** Whose list things to do go on; nobody's for those without an account. */
export function useListOf(): string | undefined {
  const { take, list } = useNotesBench();
  if (list.needsName) return undefined;
  return take.rights.change ? 'your' : `${take.player}’s`;
}
