export type TakeRight = 'read' | 'listen' | 'download' | 'note' | 'change';
export type TakeRights = Record<TakeRight, boolean>;

export const everything: TakeRights = { read: true, listen: true, download: true, note: true, change: true };
export const nothing: TakeRights = {
  read: false,
  listen: false,
  download: false,
  note: false,
  change: false,
};

/** Whatever one of the two allows. */
export function added(one: TakeRights, other: TakeRights): TakeRights {
  return {
    read: one.read || other.read,
    listen: one.listen || other.listen,
    download: one.download || other.download,
    note: one.note || other.note,
    change: one.change || other.change,
  };
}
