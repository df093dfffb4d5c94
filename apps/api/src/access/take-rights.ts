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
