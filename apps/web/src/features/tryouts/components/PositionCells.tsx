import { Box, Flex, chakra } from '@chakra-ui/react';
import { unitWord, type LengthUnit } from '../positionWords';
import { subjectWords } from '../subjectWords';
import { unitOf, type DraftAction, type TryOutDraft } from '../upload/tryOutDraft';
import { StandsHere } from './StandsHere';

/** Where one take stood, and whether that is how things stand now. */
export function PositionCells({
  draft,
  dispatch,
  lengthUnit,
  placeKey,
  number,
  text,
}: {
  draft: TryOutDraft;
  dispatch: (action: DraftAction) => void;
  lengthUnit: LengthUnit;
  placeKey: string;
  number: number;
  text: string;
}) {
  const unit = unitOf(draft);
  const { column } = subjectWords({ subject: draft.subject, differs: draft.differs || 'position' });
  return (
    <>
      <Flex
        gridColumn={{ base: '2 / -1', lg: 'auto' }}
        alignItems="baseline"
        gap="8px"
        borderBottom="2px solid"
        borderColor="edge"
      >
        <chakra.span fontSize="small" color="ink.muted" whiteSpace="nowrap" aria-hidden>
          {unit === 'label' ? 'called' : column.toLowerCase()}
        </chakra.span>
        <chakra.input
          aria-label={`${column}, take ${number}`}
          inputMode={unit === 'label' ? 'text' : 'decimal'}
          maxLength={40}
          value={text}
          onChange={(event) => dispatch({ type: 'positionWritten', key: placeKey, text: event.target.value })}
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
      <Box gridColumn={{ base: '2 / -1', lg: 'auto' }}>
        <StandsHere
          number={number}
          checked={draft.currentKey === placeKey}
          onChoose={() => dispatch({ type: 'currentChosen', key: placeKey })}
        />
      </Box>
    </>
  );
}
