import { Box } from '@chakra-ui/react';
import type { TakeOfRoom } from '@thudline/contracts';
import { lazy, Suspense, useState } from 'react';
import { Button } from '../../../components/Button';
import { PlayMark } from '../../sheet/components/PlayMark';

const HearSnares = lazy(() => import('./HearSnares').then((part) => ({ default: part.HearSnares })));

/** The last take before a change and the first after it, one snare of each; nothing is loaded before somebody asks. */
export function HearChange({ before, after }: { before: TakeOfRoom; after: TakeOfRoom }) {
  const [open, setOpen] = useState(false);
  const ask = (
    <Button look="outline" disabled={open} onClick={() => setOpen(true)}>
      <PlayMark playing={false} />
      {open ? 'Loading both…' : 'Hear it'}
    </Button>
  );
  return (
    <Box _print={{ display: 'none' }}>
      {open ? (
        <Suspense fallback={ask}>
          <HearSnares {...{ before, after }} loading={ask} />
        </Suspense>
      ) : (
        ask
      )}
    </Box>
  );
}
