import { paths } from '@thudline/contracts';

/** The list of rooms, and everything that is known of one. */
export const isRoomsKey = (roomId?: string) => (key: unknown) =>
  typeof key === 'string' &&
  (key === paths.rooms || (roomId !== undefined && key.startsWith(paths.room(roomId))));
