/**
 * The keys of all objects that rows stand on, one query that a reader may filter. A new kind of object is added here, and to
 * `knownPrefixes`; the repair leaves alone what lies elsewhere.
 */
export const keptObjects = `
  select object_key as key from take_file
  union all select object_key from added_file where object_key is not null
  union all select object_key from photo
  union all select object_key from export where object_key is not null
  union all
    select 'takes/' || m.take_id || '/measurements/' || m.id || '-' || m.attempt || '/' || t.id || '.peaks'
    from measurement m join take_track t on t.take_id = m.take_id
    where m.state = 'done'`;

export const knownPrefixes = ['takes/', 'photos/', 'exports/'] as const;
