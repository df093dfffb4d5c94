import { LeaveQuestion } from '../../../components/LeaveQuestion';
import { useLeaveGuard } from '../../../lib/useLeaveGuard';

/** Asks before what was written is lost. */
export function UnkeptQuestion({ isChanged }: { isChanged: boolean }) {
  const { asking, stay, leave } = useLeaveGuard(isChanged);
  if (!asking) return null;
  return (
    <LeaveQuestion
      {...{ stay, leave }}
      strong="This setup isn’t kept yet."
      rest="Leaving loses what you wrote."
      leaveWords="Leave without it"
    />
  );
}
