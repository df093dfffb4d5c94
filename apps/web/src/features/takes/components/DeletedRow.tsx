import type { TakeListItem, Target } from '@thudline/contracts';
import { useState, type ReactNode } from 'react';
import { takeName } from '../rowWords';
import { RowAction, TakeRow } from './TakeRow';

/** A take that was deleted: all it said, and the way back. */
export function DeletedRow({
  take,
  target,
  now,
  chosen,
  box,
  onRestore,
}: {
  take: TakeListItem;
  target: Target;
  now: Date;
  chosen: boolean;
  box: ReactNode;
  onRestore?: () => Promise<void>;
}) {
  const [busy, setBusy] = useState(false);
  const restore = async () => {
    setBusy(true);
    await onRestore?.();
    setBusy(false);
  };
  return (
    <TakeRow
      take={take}
      target={target}
      now={now}
      chosen={chosen}
      box={box}
      action={
        onRestore && (
          <RowAction
            color="ink"
            textDecoration="underline"
            disabled={busy}
            aria-label={`restore ${takeName(take)}`}
            onClick={() => void restore()}
          >
            Restore
          </RowAction>
        )
      }
    />
  );
}
