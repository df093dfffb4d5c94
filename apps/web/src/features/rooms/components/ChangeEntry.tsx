import { Box, Flex, chakra } from '@chakra-ui/react';
import type { RoomChangeResponse } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { ButtonLink } from '../../../components/ButtonLink';
import { StatusMark } from '../../../components/StatusMark';
import { TextLink } from '../../../components/TextLink';
import { ChangeRow } from '../pictures/ChangeRow';
import { categoryWords, dayWords } from '../roomWords';
import { FigureTable } from './FigureTable';

const statusWords = { good: 'Good', watch: 'Watch', fix: 'Fix', 'cannot-tell': 'Can’t tell' } as const;

/** One change of the log: when and what, what it did as a sentence, then the figures. */
export function ChangeEntry({ change, onEdit }: { change: RoomChangeResponse; onEdit?: () => void }) {
  const { status, strong, rest } = change.did;
  return (
    <Box
      as="li"
      listStyleType="none"
      borderTop="1px solid"
      borderColor="rule"
      paddingTop="16px"
      paddingBottom="22px"
      position="relative"
      display={{ base: 'block', md: 'grid' }}
      gridTemplateColumns="90px minmax(0, 1fr)"
      breakInside="avoid"
    >
      <Flex gap="12px" alignItems="center" alignSelf="start" color="ink.muted" fontSize="small">
        {change.before.length > 0 && change.after.length > 0 && (
          <Box position={{ base: 'static', lg: 'absolute' }} left="-46px" top="18px" flexShrink={0}>
            <StatusMark status={status} />
          </Box>
        )}
        <time dateTime={change.happenedOn}>{dayWords(change.happenedOn)}</time>
      </Flex>
      <Box minWidth={0}>
        <chakra.h3 fontSize="finding" fontWeight={600} lineHeight="26px">
          <Ring number={change.number} /> {change.what}
        </chakra.h3>
        <About change={change} onEdit={onEdit} />
        {change.note && (
          <Box
            whiteSpace="pre-wrap"
            marginTop="6px"
            fontSize="small"
            color="ink.muted"
            overflowWrap="anywhere"
          >
            {change.note}
          </Box>
        )}
        <Box marginTop="6px" maxWidth="600px">
          <chakra.span srOnly>{statusWords[status]}: </chakra.span>
          <b>{strong}</b> {rest}
        </Box>
        {change.before.length > 0 && change.after.length === 0 && (
          <Box marginTop="12px" _print={{ display: 'none' }}>
            <ButtonLink to="/takes/new" look="outline">
              Add the after take
            </ButtonLink>
          </Box>
        )}
        {change.figures.length > 0 && (
          <>
            <Box role="list" aria-label={`Figures of change ${change.number}`} marginTop="10px">
              {change.figures.map((figure) => (
                <ChangeRow key={figure.key} figure={figure} />
              ))}
            </Box>
            <FigureTable figures={change.figures} />
          </>
        )}
      </Box>
    </Box>
  );
}

function Ring({ number }: { number: number }) {
  return (
    <chakra.span
      display="inline-grid"
      placeItems="center"
      width="24px"
      height="24px"
      border="2px solid"
      borderColor="ink"
      borderRadius="50%"
      fontSize="caption"
      lineHeight="1"
      marginRight="4px"
    >
      {number}
    </chakra.span>
  );
}

function About({ change, onEdit }: { change: RoomChangeResponse; onEdit?: () => void }) {
  const { category, cost, place, before, after } = change;
  const words = [categoryWords[category], place && 'on the plan', cost].filter(Boolean).join(' · ');
  return (
    <Box fontSize="caption" color="ink.muted" lineHeight="22px">
      {words}
      {before.length > 0 && <Takes side="before" takes={before} />}
      {after.length > 0 && <Takes side="after" takes={after} />}
      {onEdit && (
        <>
          {' · '}
          <TextButton
            onClick={onEdit}
            aria-label={`edit change ${change.number}`}
            position="relative"
            _after={{ content: '""', position: 'absolute', inset: '-12px -10px' }}
          >
            edit
          </TextButton>
        </>
      )}
    </Box>
  );
}

function Takes({ side, takes }: { side: 'before' | 'after'; takes: RoomChangeResponse['before'] }) {
  return (
    <>
      {` · ${side}: take${takes.length > 1 ? 's' : ''} `}
      {takes.map(({ id, number }, i) => (
        <span key={id}>
          {i > 0 && ', '}
          <TextLink to={`/takes/${id}`} aria-label={`take ${number}`}>
            {number}
          </TextLink>
        </span>
      ))}
    </>
  );
}
