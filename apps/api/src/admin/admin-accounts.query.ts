import { AccountResponse, ListAccountsRequest, Role } from '@thudline/contracts';
import { storedBytes } from '../storage/stored-bytes';

export const accountsAtOnce = 50;

export interface AccountRow {
  id: string;
  name: string;
  email: string;
  email_verified_at: Date | null;
  roles: Role[];
  locked_at: Date | null;
  created_at: Date;
  seen_at: Date | null;
  takes: number;
  bytes: number;
  quota_bytes: string | null;
  delete_after: Date | null;
}

const columns = `
  u.id, u.name, u.email, u.email_verified_at, u.roles, u.locked_at, u.created_at, u.quota_bytes, u.delete_after,
  (select max(s.rotated_at) from session s where s.user_id = u.id) as seen_at,
  (select count(*)::int from take t where t.owner_id = u.id and t.deleted_at is null) as takes,
  ${storedBytes} as bytes`;

/** A pattern's own signs are letters here: nobody looks for "any letter". */
const pattern = (find: string) => `%${find.toLowerCase().replace(/[\\%_]/g, '\\$&')}%`;

interface Query {
  text: string;
  values: unknown[];
}

/** One more than a page, so that one knows whether there is another. Ids are made in the order of time. */
export function accountsQuery({ find, after }: ListAccountsRequest): Query {
  const fits = fitting(find);
  const conditions = [...fits.conditions, ...(after ? ['u.id < ?'] : [])];
  const where = conditions.length > 0 ? `where ${conditions.join(' and ')}` : '';
  return {
    text: `select ${columns} from "user" u ${where} order by u.id desc limit ${accountsAtOnce + 1}`,
    values: [...fits.values, ...(after ? [after] : [])],
  };
}

export function accountsCount({ find }: ListAccountsRequest): Query {
  const { conditions, values } = fitting(find);
  const where = conditions.length > 0 ? `where ${conditions.join(' and ')}` : '';
  return { text: `select count(*)::int as total from "user" u ${where}`, values };
}

export const accountQuery = (id: string): Query => ({
  text: `select ${columns} from "user" u where u.id = ?`,
  values: [id],
});

function fitting(find: string | undefined): { conditions: string[]; values: unknown[] } {
  if (!find) return { conditions: [], values: [] };
  return {
    conditions: ['(lower(u.name) like ? or u.email_lower like ?)'],
    values: [pattern(find), pattern(find)],
  };
}

export function accountResponseOf(row: AccountRow): AccountResponse {
  const iso = (date: Date | null) => (date ? new Date(date).toISOString() : null);
  return {
    id: row.id,
    name: row.name,
    email: row.email,
    emailVerified: row.email_verified_at !== null,
    roles: row.roles,
    locked: row.locked_at !== null,
    joinedAt: new Date(row.created_at).toISOString(),
    seenAt: iso(row.seen_at),
    takes: row.takes,
    bytes: row.bytes,
    quotaBytes: row.quota_bytes === null ? null : Number(row.quota_bytes),
    deleteAfter: iso(row.delete_after),
  };
}
