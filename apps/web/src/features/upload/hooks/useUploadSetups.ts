import { useSetups } from '../../setups/hooks/useSetups';
import { chosenAmong } from '../lastChosen';

/** The setups a take can have, and how things stand now. */
export function useUploadSetups() {
  const { setups = [], currentId } = useSetups();
  return { all: setups, chosen: (here: string | null) => chosenAmong(setups, here, currentId) };
}
