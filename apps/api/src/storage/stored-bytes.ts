/** What an account keeps, as SQL over `u`: recordings and added files, also of takes deleted not long ago, and photos. */
export const storedBytes = `(
  (select coalesce(sum(f.bytes), 0) from take_file f join take t on t.id = f.take_id where t.owner_id = u.id)
  + (select coalesce(sum(a.bytes), 0) from added_file a join take t on t.id = a.take_id where t.owner_id = u.id)
  + (select coalesce(sum(p.bytes), 0) from photo p where p.owner_id = u.id))::float8`;
