import { useRooms } from '../../rooms/hooks/useRooms';
import { chosenAmong, lastChosen } from '../lastChosen';

const last = lastChosen('thudline.room');

/** The rooms a take can be recorded in, and the one chosen last. */
export function useUploadRooms() {
  const { rooms = [] } = useRooms();
  return {
    all: rooms,
    chosen: (here: string | null) => chosenAmong(rooms, here, last.read()),
    remember: last.write,
  };
}
