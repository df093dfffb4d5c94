import type { SetupFields } from '@thudline/contracts';
import { useState } from 'react';

type Group = 'kick' | 'overhead' | 'kickPreamp' | 'overheadPreamp';

/** What is written on the page, kept or not yet. */
export function useSetupDraft(kept: SetupFields, begun: SetupFields = kept) {
  const [fields, setFields] = useState(begun);
  return {
    fields,
    isChanged: JSON.stringify(fields) !== JSON.stringify(kept),
    write: (change: Partial<SetupFields>) => setFields((now) => ({ ...now, ...change })),
    writeIn: <G extends Group>(group: G, change: Partial<SetupFields[G]>) =>
      setFields((now) => ({ ...now, [group]: { ...now[group], ...change } })),
    replace: setFields,
  };
}

export type SetupDraft = ReturnType<typeof useSetupDraft>;

/** A setup's fields without what the server adds to them. */
export function fieldsOf(setup: SetupFields): SetupFields {
  const { name, kick, overhead, kickPreamp, overheadPreamp, interface: pluggedInto, rest } = setup;
  return { name, kick, overhead, kickPreamp, overheadPreamp, interface: pluggedInto, rest };
}
