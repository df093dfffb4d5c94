import { Box, Flex, chakra } from '@chakra-ui/react';
import type { TryOutPlaceResponse, TryOutResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { takeName } from '../../takes/rowWords';
import { positionText, typedPosition } from '../positionInput';
import { unitWord, type LengthUnit, type Position } from '../positionWords';
import { subjectWords } from '../subjectWords';
import { StandsHere } from './StandsHere';

interface PlaceEditProps {
  tryOut: TryOutResponse;
  place: TryOutPlaceResponse;
  number: number;
  lengthUnit: LengthUnit;
  onMove: (to: Position) => void;
  onStandsHere: () => void;
  onTakeOut: (name: string) => void;
}

/** One take of a try-out: where it stood, whether that is how things stand now, and the way out. */
export function PlaceEdit(props: PlaceEditProps) {
  const { tryOut, place, number, lengthUnit, onMove } = props;
  const { unit } = tryOut;
  const kept = positionText(place, unit, lengthUnit);
  const [written, setWritten] = useState<string | null>(null);
  const text = written ?? kept;
  const typed = typedPosition(text, unit, lengthUnit);
  const name = place.take ? takeName(place.take) : place.fileNames.join(' and ');
  const keepPosition = () => {
    if (!typed) return;
    if (text.trim() !== kept) onMove(typed);
    setWritten(null);
  };
  return (
    <chakra.li
      display="grid"
      gridTemplateColumns={{ base: 'minmax(0, 1fr) auto', lg: 'minmax(0, 1fr) 190px 150px 70px' }}
      columnGap="14px"
      alignItems="center"
      paddingY="6px"
      borderBottom="1px solid"
      borderColor="rule"
    >
      <Box fontWeight={600} overflowWrap="anywhere" gridColumn={{ base: '1 / -1', lg: 'auto' }}>
        {name}
      </Box>
      <Flex alignItems="baseline" gap="8px" borderBottom="2px solid" borderColor={typed ? 'edge' : 'fix'}>
        <chakra.input
          aria-label={`${subjectWords(tryOut).column}, take ${number}`}
          aria-invalid={typed ? undefined : true}
          inputMode={unit === 'label' ? 'text' : 'decimal'}
          maxLength={40}
          value={text}
          onChange={(event) => setWritten(event.target.value)}
          onBlur={keepPosition}
          onKeyDown={(event) => event.key === 'Enter' && keepPosition()}
          minWidth={0}
          width="100%"
          minHeight="42px"
          bg="transparent"
          color="ink"
          fontWeight={600}
          borderRadius="0"
        />
        <chakra.span color="ink.muted">{unitWord(unit, lengthUnit)}</chakra.span>
      </Flex>
      <StandsHere
        number={number}
        checked={tryOut.currentPlaceId === place.id}
        onChoose={props.onStandsHere}
      />
      <Box textAlign="right" gridColumn={{ base: '2', lg: 'auto' }}>
        <TextButton
          type="button"
          aria-label={`Take out ${name}`}
          minHeight="44px"
          onClick={() => props.onTakeOut(name)}
        >
          Take out
        </TextButton>
      </Box>
      {!typed && (
        <Box gridColumn="1 / -1">
          <FieldError>Write the position as a number.</FieldError>
        </Box>
      )}
    </chakra.li>
  );
}
