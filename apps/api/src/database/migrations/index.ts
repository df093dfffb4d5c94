import { Migration20261201081617_takesAndSheets } from './20261201081617-takes-and-sheets';

/** In order; a new migration is added at the end and never changed once merged. */
export const migrations = [
  { name: '20261201081617-takes-and-sheets', class: Migration20261201081617_takesAndSheets },
];
