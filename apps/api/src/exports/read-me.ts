/** Stands at the top of an archive. Lines end as every editor can read them. */
export function readMe(name: string, madeAt: Date): string {
  return [
    `Everything of ${name} at Thudline, as it was on ${madeAt.toISOString().slice(0, 16).replace('T', ' ')} UTC.`,
    '',
    'takes/      one folder a take: its recordings bit for bit as they were uploaded, added files,',
    '            take.json (what you wrote), report.json (what was measured, and what the sheet says)',
    'takes.csv   one row a take, for a spreadsheet',
    'try-outs.csv  one row a position of a try-out',
    'photos/     of setups and rooms; data/photo.json says when each was added',
    'data/       every row that is yours, by kind: takes, rooms and their logs, setups, try-outs, notes, links',
    'account.json  your name, address and settings',
    '',
    'Takes that you deleted are not in here.',
    '',
  ].join('\r\n');
}
