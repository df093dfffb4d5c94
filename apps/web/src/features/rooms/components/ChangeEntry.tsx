import { Box, Flex, chakra } from '@chakra-ui/react';
import type { RoomChangeResponse } from '@thudline/contracts';
import { ButtonLink } from '../../../components/ButtonLink';
import { StatusMark } from '../../../components/StatusMark';
import { ChangeRow } from '../pictures/ChangeRow';
import { dayWords } from '../roomWords';
import { ChangeAbout, type EntryActions } from './ChangeAbout';
import { ChangePhoto } from './ChangePhoto';
import { FigureTable } from './FigureTable';
import { HearChange } from './HearChange';

const statusWords = { good: 'Good', watch: 'Watch', fix: 'Fix', 'cannot-tell': 'Can’t tell' } as const;

/** One change of the log: when and what, what it did as a sentence, then the figures. */
export function ChangeEntry({
  roomId,
  change,
  canHear,
  actions,
}: {
  roomId: string;
  change: RoomChangeResponse;
  canHear: boolean;
  actions?: EntryActions;
}) {
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
        {change.isTold && change.before.length > 0 && change.after.length > 0 && (
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
        <ChangeAbout change={change} actions={actions} />
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
          {change.isTold ? (
            <>
              <chakra.span srOnly>{statusWords[status]}: </chakra.span>
              <b>{strong}</b> {rest}
            </>
          ) : (
            <chakra.span color="ink.muted">Comparing its takes…</chakra.span>
          )}
        </Box>
        {change.before.length > 0 && change.after.length === 0 && (
          <Box marginTop="12px" _print={{ display: 'none' }}>
            <ButtonLink to="/takes/new" look="outline">
              Add the after take
            </ButtonLink>
          </Box>
        )}
        {change.caveats.map((caveat) => (
          <Box key={caveat} fontSize="small" color="ink.muted" marginTop="4px" maxWidth="600px">
            {caveat}
          </Box>
        ))}
        {change.figures.length > 0 && <Figures change={change} canHear={canHear} />}
        <ChangePhoto {...{ roomId, change }} canChange={actions !== undefined} />
      </Box>
    </Box>
  );
}

function Figures({ change, canHear }: { change: RoomChangeResponse; canHear: boolean }) {
  const [before, after] = [change.before.at(-1), change.after[0]];
  return (
    <>
      <Box role="list" aria-label={`Figures of change ${change.number}`} marginTop="10px">
        {change.figures.map((figure) => (
          <ChangeRow key={figure.key} figure={figure} />
        ))}
      </Box>
      <Flex wrap="wrap" columnGap="20px" alignItems="flex-start" marginTop="8px">
        {canHear && before && after && <HearChange {...{ before, after }} />}
        <FigureTable figures={change.figures} />
      </Flex>
    </>
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
