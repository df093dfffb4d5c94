import { Box } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import { clock } from '../../../lib/format';
import type { Listening } from '../hooks/useListening';
import { PlayMark } from './PlayMark';

/** Plays the whole take with the choice that stands on the sheet. */
export function HearTake({
  listening,
  durationS,
  look,
}: {
  listening: Listening;
  durationS: number;
  look: 'solid' | 'outline';
}) {
  const plays = listening.playing === 'take';
  return (
    <>
      <Button
        look={look}
        aria-pressed={plays}
        onClick={() => (plays ? listening.stop() : void listening.playTake())}
      >
        <PlayMark playing={plays} />
        {plays ? 'Stop' : `Hear this take, ${clock(durationS)}`}
      </Button>
      <Box order={2} width="100%" marginTop="-6px" fontSize="caption" color="ink.muted">
        Heard {listening.heardWords}, as chosen under Adding up.
      </Box>
    </>
  );
}
