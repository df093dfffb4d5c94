import { Box } from '@chakra-ui/react';
import type { TakeListItem, Target } from '@thudline/contracts';
import { useEffect, useRef, useState, type ReactNode } from 'react';
import { useNow } from '../hooks/useNow';
import { isMeasuring } from '../rowWords';
import { DeleteRow } from './DeleteRow';
import { MeasuringRow } from './MeasuringRow';
import { TakeRow } from './TakeRow';
import { TakesHead } from './TakesHead';

/** The ruled table: one row a take, its pictures under one axis. */
export function TakesTable({
  takes,
  target,
  onDelete,
}: {
  takes: TakeListItem[];
  target: Target;
  onDelete: (take: TakeListItem) => Promise<void>;
}) {
  const now = useNow();
  const { askedId, ask, keep, deleteButton } = useDeleteQuestion();
  return (
    <TableFrame target={target}>
      {takes.map((take) => {
        if (take.id === askedId) {
          return <DeleteRow key={take.id} take={take} onDelete={() => onDelete(take)} onKeep={keep} />;
        }
        if (isMeasuring(take.measurement)) return <MeasuringRow key={take.id} take={take} now={now} />;
        return (
          <TakeRow
            key={take.id}
            take={take}
            target={target}
            now={now}
            deleteRef={deleteButton(take.id)}
            onDelete={() => ask(take.id)}
          />
        );
      })}
    </TableFrame>
  );
}

export function TableFrame({ target, children }: { target: Target; children: ReactNode }) {
  return (
    <Box role="table" aria-label="Takes" marginTop="16px" borderBottom="2px solid" borderColor="ink">
      <TakesHead target={target} />
      <Box role="rowgroup" css={{ '& > :last-child': { borderBottomWidth: 0 } }}>
        {children}
      </Box>
    </Box>
  );
}

/** Which row asks before deleting; keeping the take gives the focus back to where the question came from. */
function useDeleteQuestion() {
  const [askedId, setAskedId] = useState<string | null>(null);
  const keptId = useRef<string | null>(null);
  const keptButton = useRef<HTMLButtonElement | null>(null);
  useEffect(() => {
    if (askedId === null) keptButton.current?.focus();
    keptButton.current = null;
    keptId.current = null;
  }, [askedId]);
  return {
    askedId,
    ask: (takeId: string) => setAskedId(takeId),
    keep: () => {
      keptId.current = askedId;
      setAskedId(null);
    },
    deleteButton: (takeId: string) => (button: HTMLButtonElement | null) => {
      if (button && takeId === keptId.current) keptButton.current = button;
    },
  };
}
