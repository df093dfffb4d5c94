import { Box, Flex, chakra } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import { Swell } from '../../../components/Swell';
import { signedDecibels } from '../../../lib/format';
import type { useHitExcerpt } from '../hooks/useHitExcerpt';
import type { PairBenchProps } from './PairBench';
import { PlayMark } from './PlayMark';

interface ChoiceRowProps extends Omit<PairBenchProps, 'pair' | 'singleKeys'> {
  hitExcerpt: ReturnType<typeof useHitExcerpt>;
  hitNumber: number;
}

/** Play a hit on repeat, go to another, and go through the choices. */
export function ChoiceRow(props: ChoiceRowProps) {
  const { bench, listening, canListen } = props;
  return (
    <Box marginTop="14px" _print={{ display: 'none' }}>
      <Flex columnGap={{ base: '14px', lg: '16px' }} rowGap="10px" alignItems="center" wrap="wrap">
        {canListen && <PlayHit {...props} />}
        {canListen && <HitSteps {...props} />}
        <Choices bench={bench} />
      </Flex>
      {canListen && (
        <Box fontSize="caption" color="ink.muted" marginTop="10px" lineHeight="19px">
          Choices are matched from 1 to 8 kHz, so that the low end can differ
          {Math.abs(listening.matchDb) >= 0.05 ? ` (this one ${signedDecibels(listening.matchDb)})` : ''}.
          Listen on headphones, not too loud: small speakers can’t play this low.
        </Box>
      )}
      {listening.failure && (
        <Box role="alert" color="fix" fontSize="small" marginTop="6px">
          {listening.failure}
        </Box>
      )}
    </Box>
  );
}

function PlayHit({ listening, hitExcerpt: { excerpt }, hitNumber }: ChoiceRowProps) {
  const plays = listening.playing === 'hit';
  return (
    <Button
      look="outline"
      disabled={!excerpt}
      aria-pressed={plays}
      onClick={() => (plays ? listening.stop() : excerpt && void listening.playHit(excerpt))}
    >
      <PlayMark playing={plays} />
      {plays ? `Stop hit ${hitNumber}` : `Hit ${hitNumber}, on repeat`}
    </Button>
  );
}

function Choices({ bench: { choices, chosen, set } }: { bench: ChoiceRowProps['bench'] }) {
  return (
    <Flex role="group" aria-label="Choice" columnGap="17px" rowGap="8px" wrap="wrap">
      {choices.map((choice) => {
        const on = choice === chosen;
        return (
          <chakra.button
            key={choice.name}
            aria-pressed={on}
            position="relative"
            cursor="pointer"
            minHeight="32px"
            color={on ? 'ink' : 'ink.muted'}
            fontWeight={on ? 600 : 400}
            onClick={() => set({ flipped: choice.flipped, shiftMs: choice.shiftMs })}
          >
            {choice.label}
            {on && <Swell depthPx={5.5} linePx={1.5} />}
          </chakra.button>
        );
      })}
    </Flex>
  );
}

export function HitSteps({
  kickHits,
  chosenHit,
  onChooseHit,
}: Pick<ChoiceRowProps, 'kickHits' | 'chosenHit' | 'onChooseHit'>) {
  const at = kickHits.indexOf(chosenHit);
  const step = (by: number, label: string, path: string) => (
    <chakra.button
      aria-label={label}
      disabled={kickHits[at + by] === undefined}
      width="32px"
      height="44px"
      display="inline-flex"
      alignItems="center"
      justifyContent="center"
      cursor="pointer"
      _disabled={{ opacity: 0.35, cursor: 'not-allowed' }}
      onClick={() => onChooseHit(kickHits[at + by])}
    >
      <svg
        width="12"
        height="14"
        viewBox="0 0 12 14"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
        aria-hidden
      >
        <path d={path} />
      </svg>
    </chakra.button>
  );
  return (
    <Flex marginLeft={{ base: '-8px', lg: '-18px' }}>
      {step(-1, 'Hit before', 'M9 1 3 7l6 6')}
      {step(1, 'Hit after', 'M3 1l6 6-6 6')}
    </Flex>
  );
}
