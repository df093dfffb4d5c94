const ownTakes = 'select id from take where owner_id = :owner and deleted_at is null';
const ownRooms = 'select id from room where owner_id = :owner';
const ownTryOuts = 'select id from try_out where owner_id = :owner';

/**
 * Which rows of which table are a person's, in the order they are told. A table that is in neither of the two lists fails
 * a test: what is new can't be forgotten.
 */
export const exportedTables: Readonly<Record<string, string>> = {
  take: 'owner_id = :owner and deleted_at is null',
  take_file: `take_id in (${ownTakes})`,
  take_track: `take_id in (${ownTakes})`,
  added_file: `take_id in (${ownTakes})`,
  setup: 'owner_id = :owner',
  room: 'owner_id = :owner',
  room_change: `room_id in (${ownRooms})`,
  room_change_take: `change_id in (select id from room_change where room_id in (${ownRooms}))`,
  try_out: 'owner_id = :owner',
  try_out_place: `try_out_id in (${ownTryOuts})`,
  photo: 'owner_id = :owner',
  share: 'owner_id = :owner',
  /** The whole conversation on their sheets, and what they wrote on those of others. */
  note: `deleted_at is null and (author_id = :owner or take_id in (${ownTakes}))`,
  next_item: `note_id in
    (select id from note where deleted_at is null and (author_id = :owner or take_id in (${ownTakes})))`,
  read_mark: 'user_id = :owner',
  complaint: 'reporter_id = :owner',
  audit_event: 'user_id = :owner',
};

/** What is left out, and why. */
export const leftOutTables: Readonly<Record<string, string>> = {
  user: 'is account.json',
  session: 'holds secrets; it is on the settings page',
  one_time_token: 'holds secrets',
  export: 'is what is being made',
  measurement: 'is how a report came about; reports are whole',
  report: 'is report.json beside each take',
  pair_spectrum: 'is told by the report',
  mail_refusal: 'is of addresses without an account',
  setting: 'is the installation’s',
  throttle: 'only counts tries',
};

/** Nothing of this leaves the server, not even to its owner. */
export const secretColumns = [
  'token_hash',
  'passphrase_hash',
  'password_hash',
  'object_key',
  'guest_id',
] as const;
