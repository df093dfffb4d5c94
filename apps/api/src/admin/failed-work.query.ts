import { FailedWork } from '@thudline/contracts';

export interface FailedRow {
  kind: FailedWork['kind'];
  id: string;
  at: Date;
  what: string;
  account_id: string | null;
  account_name: string | null;
  reason: string | null;
  again_at: Date | null;
}

/**
 * What went wrong and stayed so: of a take only its latest measurement, and no mail that somebody was kept from wanting.
 * Mails that are tried again by themselves are told with when.
 */
export const failedWorkQuery = `
  select * from (
    select 'measurement' as kind, m.id, m.heartbeat_at as at, 'take ' || t.number as what,
      u.id as account_id, u.name as account_name, m.reason, null::timestamptz as again_at
    from measurement m join take t on t.id = m.take_id join "user" u on u.id = t.owner_id
    where m.state = 'failed' and t.deleted_at is null and not exists (
      select 1 from measurement later where later.take_id = m.take_id and later.id > m.id)
    union all
    select 'added-file', a.id, a.heartbeat_at, 'take ' || t.number, u.id, u.name, a.reason, null
    from added_file a join take t on t.id = a.take_id join "user" u on u.id = t.owner_id
    where a.state = 'failed' and t.deleted_at is null
    union all
    select 'export', e.id, e.heartbeat_at, 'everything', u.id, u.name, e.reason, null
    from export e join "user" u on u.id = e.owner_id where e.state = 'failed'
    union all
    select 'mail', j.id, coalesce(j.completed_on, j.started_on, j.created_on), j.data->>'kind', u.id, u.name,
      coalesce(j.output->>'message', 'The mail server did not take it.'),
      case when j.state = 'retry' then j.start_after end
    from pgboss.job j left join "user" u
      on u.id::text = j.data->>'userId' or u.email_lower = lower(j.data->>'email')
    where j.name = 'mail' and j.state in ('retry', 'failed')
  ) failed order by at desc limit 200`;

export function failedWorkOf(row: FailedRow): FailedWork {
  const { kind, id, at, what, account_id: accountId, account_name: name, reason, again_at: againAt } = row;
  return {
    kind,
    id,
    at: new Date(at).toISOString(),
    what,
    account: accountId && name !== null ? { id: accountId, name } : null,
    reason: reason ?? '',
    againAt: againAt ? new Date(againAt).toISOString() : null,
  };
}

/** A mail whose turn it is now, whatever became of it before. */
export const retryMail = `
  update pgboss.job set state = 'retry', start_after = now(), completed_on = null,
    retry_limit = greatest(retry_limit, retry_count + 1)
  where name = 'mail' and id = ? and state in ('retry', 'failed') returning id`;
