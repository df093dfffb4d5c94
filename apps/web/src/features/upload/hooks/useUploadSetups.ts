import { useSetups } from '../../setups/hooks/useSetups';
import { chosenAmong, lastChosen } from '../lastChosen';

const last = lastChosen('thudline.setup');

/** The setups a take can have, and the one chosen last. */
export function useUploadSetups() {
  const { setups = [] } = useSetups();
  return {
    all: setups,
    chosen: (here: string | null) => chosenAmong(setups, here, last),
    remember: last.write,
  };
}
