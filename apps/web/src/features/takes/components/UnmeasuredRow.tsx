import type { TakeListItem, Target } from '@thudline/contracts';
import { useState, type ReactNode } from 'react';
import { takeName } from '../rowWords';
import { RowAction, TakeRow } from './TakeRow';

/** A take whose measurement failed or was stopped: why, and the way to try once more. */
export function UnmeasuredRow({
  take,
  target,
  now,
  chosen,
  box,
  onMeasure,
}: {
  take: TakeListItem;
  target: Target;
  now: Date;
  chosen: boolean;
  box: ReactNode;
  onMeasure: () => Promise<void>;
}) {
  const [failure, setFailure] = useState('');
  const [busy, setBusy] = useState(false);
  const measure = async () => {
    setBusy(true);
    setFailure('');
    try {
      await onMeasure();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'that did not work. Try again.');
    } finally {
      setBusy(false);
    }
  };
  return (
    <TakeRow
      {...{ take, target, now, chosen, box, failure }}
      action={
        <RowAction
          color="ink"
          textDecoration="underline"
          disabled={busy}
          aria-label={`measure ${takeName(take)} again`}
          onClick={() => void measure()}
        >
          again
        </RowAction>
      }
    />
  );
}
