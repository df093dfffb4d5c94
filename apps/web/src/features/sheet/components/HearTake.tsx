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
      {listening.failure && listening.playing === 'nothing' && (
        <Box role="alert" color="fix" fontSize="small" alignSelf="center">
          {listening.failure}
        </Box>
      )}
    </>
  );
}
