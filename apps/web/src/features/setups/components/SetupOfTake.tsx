import type { TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { BelongsTo } from '../../../components/BelongsTo';
import { useTakeEdits } from '../../sheet/hooks/useTakeEdits';
import { useSetups } from '../hooks/useSetups';

/** What a take was recorded with, at the head of the sheet's margin, and the way to change it. */
export function SetupOfTake({ take }: { take: TakeResponse }) {
  const { update } = useTakeEdits(take);
  const [asked, setAsked] = useState(false);
  const { setups, error } = useSetups(asked);
  return (
    <BelongsTo
      words={{
        to: 'Recorded with',
        none: 'no setup',
        ask: 'say what it was recorded with',
        label: 'Recorded with',
      }}
      one={take.setup && { ...take.setup, path: `/setups/${take.setup.id}` }}
      canChange={take.rights.change}
      choices={setups}
      error={error}
      onAsk={() => setAsked(true)}
      first={{ path: '/setups/new', words: 'Write down your first setup' }}
      onChoose={(setupId) => update({ setupId })}
    />
  );
}
