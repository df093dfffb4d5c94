import type { OpenedShareResponse } from '@thudline/contracts';
import { SharedComparison } from './SharedComparison';
import { SharedRoom } from './SharedRoom';
import { SharedTryOut } from './SharedTryOut';

/** What speaks of several takes. Most links are to a sheet, whose readers load nothing of this. */
export function SharedSeveral({ opened }: { opened: OpenedShareResponse }) {
  const { subject } = opened;
  switch (subject.kind) {
    case 'take':
      return null;
    case 'comparison':
      return <SharedComparison opened={opened} takeId={subject.takeId} otherTakeId={subject.otherTakeId} />;
    case 'try-out':
      return <SharedTryOut opened={opened} tryOutId={subject.tryOutId} />;
    case 'room':
      return <SharedRoom opened={opened} roomId={subject.roomId} />;
  }
}
