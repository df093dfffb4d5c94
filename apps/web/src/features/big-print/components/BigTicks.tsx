import { Box } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { useTakeEdits } from '../../sheet/hooks/useTakeEdits';
import { allDoneWords, type BigAction } from '../bigActions';

const big = { width: '100%', fontSize: '21px', minHeight: '64px' } as const;
const lesser = { look: 'outline', width: '100%', fontSize: '19px', minHeight: '56px' } as const;

/** Ticks what was done: everything at once, or one thing at a time. */
export function BigTicks({ take, actions }: { take: TakeResponse; actions: BigAction[] }) {
  const { update } = useTakeEdits(take);
  const [failure, setFailure] = useState('');
  const ids = actions.map(({ id }) => id);
  const others = take.tickedActions.filter((id) => !ids.includes(id));
  const ticked = ids.filter((id) => take.tickedActions.includes(id));
  const tick = async (done: string[]) => {
    setFailure('');
    try {
      await update({ tickedActions: [...others, ...done] });
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'The tick could not be kept. Try again.');
    }
  };
  const all = ticked.length === ids.length;
  return (
    <>
      {failure && (
        <Box textAlign="left">
          <FieldError>{failure}</FieldError>
        </Box>
      )}
      {!all && (
        <Button type="button" {...big} onClick={() => void tick(ids)}>
          {allDoneWords(ids.length)}
        </Button>
      )}
      {!all && ids.length === 2 && ticked.length === 0 && (
        <Button type="button" {...lesser} onClick={() => void tick(ids.slice(0, 1))}>
          Only the first
        </Button>
      )}
      {!all &&
        ids.length > 2 &&
        actions.map(({ id, strong }) => (
          <Button
            key={id}
            type="button"
            {...lesser}
            aria-pressed={ticked.includes(id)}
            onClick={() => void tick(ticked.includes(id) ? ticked.filter((t) => t !== id) : [...ticked, id])}
          >
            {strong}
            {ticked.includes(id) ? ': done' : ''}
          </Button>
        ))}
      {(all || (ids.length === 2 && ticked.length > 0)) && (
        <Button type="button" {...lesser} onClick={() => void tick([])}>
          Take it back
        </Button>
      )}
    </>
  );
}
