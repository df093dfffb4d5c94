import type { TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { BelongsTo } from '../../../components/BelongsTo';
import { useTakeEdits } from '../../sheet/hooks/useTakeEdits';
import { useRooms } from '../hooks/useRooms';

/** Where a take was recorded, beside its sheet, and the way to change it. */
export function RoomOfTake({ take }: { take: TakeResponse }) {
  const { update } = useTakeEdits(take);
  const [asked, setAsked] = useState(false);
  const { rooms, error } = useRooms(asked);
  return (
    <BelongsTo
      words={{ to: 'Recorded in', none: 'no room', ask: 'say in which room', label: 'Recorded in' }}
      one={take.room && { ...take.room, path: `/rooms/${take.room.id}` }}
      canChange={take.rights.change}
      choices={rooms}
      error={error}
      onAsk={() => setAsked(true)}
      first={{ path: '/rooms', words: 'Write down your first room' }}
      onChoose={(roomId) => update({ roomId })}
    />
  );
}
