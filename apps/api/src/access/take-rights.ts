/**
 * `figures`: all that is measured, without the sheet's words, notes and files. `own`: it is the asker's own take, also on a
 * phone that reads along and may change nothing.
 */
export type TakeRight = 'read' | 'figures' | 'listen' | 'download' | 'note' | 'own' | 'change';
export type TakeRights = Record<TakeRight, boolean>;

export const everything: TakeRights = {
  read: true,
  figures: true,
  listen: true,
  download: true,
  note: true,
  own: true,
  change: true,
};
export const nothing: TakeRights = {
  read: false,
  figures: false,
  listen: false,
  download: false,
  note: false,
  own: false,
  change: false,
};

/** Whatever one of the two allows. */
export function added(one: TakeRights, other: TakeRights): TakeRights {
  return {
    read: one.read || other.read,
    figures: one.figures || other.figures,
    listen: one.listen || other.listen,
    download: one.download || other.download,
    note: one.note || other.note,
    own: one.own || other.own,
    change: one.change || other.change,
  };
}

/** Only what both of the two allow. */
export function shared(one: TakeRights, other: TakeRights): TakeRights {
  return {
    read: one.read && other.read,
    figures: one.figures && other.figures,
    listen: one.listen && other.listen,
    download: one.download && other.download,
    note: one.note && other.note,
    own: one.own && other.own,
    change: one.change && other.change,
  };
}
