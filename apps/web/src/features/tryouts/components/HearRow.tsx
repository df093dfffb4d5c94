import { Box, Flex, chakra } from '@chakra-ui/react';
import { Lettered } from '../../../components/Lettered';
import { Button, TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { Swell } from '../../../components/Swell';
import { PlayMark } from '../../sheet/components/PlayMark';
import type { HearAll } from '../hooks/useHearAll';

export interface HeardChoice {
  placeId: string;
  /** "100", or "B" while the positions are hidden. */
  word: string;
  /** "take 18, 100 cm" */
  label: string;
}

/** Plays all takes in step; one of them is heard. */
export function HearRow({
  hearing,
  choices,
  unit,
  hidden,
  hideWords,
  onHide,
}: {
  hearing: HearAll;
  choices: readonly HeardChoice[];
  unit: string;
  hidden: boolean;
  /** "the heights" */
  hideWords: string;
  onHide: (hidden: boolean) => void;
}) {
  const plays = hearing.state !== 'stopped';
  return (
    <Box marginTop="14px">
      <Flex wrap="wrap" alignItems="center" columnGap="20px" rowGap="10px">
        <Button
          look="outline"
          aria-pressed={plays}
          aria-busy={hearing.state === 'loading'}
          onClick={plays ? hearing.stop : hearing.play}
        >
          <PlayMark playing={plays} />
          {hearing.state === 'loading' ? 'Fetching…' : plays ? 'Stop' : 'Hear them all'}
        </Button>
        <Flex role="group" aria-label="Which take is heard" wrap="wrap" columnGap="4px" alignItems="center">
          {choices.map((choice) => (
            <HeardButton
              key={choice.placeId}
              choice={choice}
              heard={hearing.heardId === choice.placeId}
              onChoose={() => hearing.choose(choice.placeId)}
            />
          ))}
          {!hidden && unit && (
            <chakra.span color="ink.muted" marginLeft="-6px">
              {unit}
            </chakra.span>
          )}
        </Flex>
        <Box
          marginLeft={{ base: 0, lg: 'auto' }}
          textAlign={{ lg: 'right' }}
          fontSize="caption"
          lineHeight="20px"
          color="ink.muted"
        >
          equally loud, same bar in each <Lettered>a</Lettered>
          <br />
          <TextButton type="button" aria-pressed={hidden} onClick={() => onHide(!hidden)}>
            {hidden ? `show ${hideWords} again` : `shuffle and hide ${hideWords}`}
          </TextButton>
        </Box>
      </Flex>
      {hearing.failure && <FieldError>{hearing.failure}</FieldError>}
    </Box>
  );
}

function HeardButton({
  choice,
  heard,
  onChoose,
}: {
  choice: HeardChoice;
  heard: boolean;
  onChoose: () => void;
}) {
  return (
    <chakra.button
      type="button"
      aria-pressed={heard}
      aria-label={`Hear ${choice.label}`}
      minWidth="44px"
      minHeight="44px"
      paddingX="8px"
      cursor="pointer"
      color={heard ? 'ink' : 'ink.muted'}
      fontWeight={heard ? 600 : 400}
      onClick={onChoose}
    >
      <chakra.span position="relative" display="inline-block" lineHeight="26px">
        {choice.word}
        {heard && <Swell depthPx={5} linePx={1.75} />}
      </chakra.span>
    </chakra.button>
  );
}
