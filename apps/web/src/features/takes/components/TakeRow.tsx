import { Box, Flex, chakra } from '@chakra-ui/react';
import type { FindingStatus, TakeListItem, Target } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { TextButton } from '../../../components/Button';
import { StatusMark } from '../../../components/StatusMark';
import { unmeasuredWords } from '../rowWords';
import { LevelPicture } from './LevelPicture';
import { LowEndPicture } from './LowEndPicture';
import { rowGrid, rowMinHeight } from './tableGrid';
import { TakeCell } from './TakeCell';

const statusWords: Record<FindingStatus, string> = {
  good: 'Good',
  watch: 'Watch',
  fix: 'Fix',
  'cannot-tell': 'Can’t tell',
};

/** One measured take, or one that could not be. */
export function TakeRow({
  take,
  target,
  now,
  chosen = false,
  box,
  action,
  failure,
}: {
  take: TakeListItem;
  target: Target;
  now: Date;
  chosen?: boolean;
  box?: ReactNode;
  action?: ReactNode;
  /** What was tried from this row did not work. */
  failure?: string;
}) {
  return (
    <RuledRow chosen={chosen}>
      {box}
      <TakeCell take={take} now={now} />
      <Says take={take} failure={failure} />
      <Box role="cell" gridArea="level" position="relative" minHeight={{ base: '44px', lg: 'auto' }}>
        <LevelPicture take={take} target={target} />
      </Box>
      <Box role="cell" gridArea="low" position="relative">
        <LowEndPicture lowEndDb={take.lowEndDb} />
      </Box>
      <ActionCell>
        <Flex flexDirection="column" alignItems="flex-end">
          <NotesCount take={take} />
          {action}
        </Flex>
      </ActionCell>
    </RuledRow>
  );
}

/** A chosen row is told by the bar at its left, not by its tint alone. */
export function RuledRow({
  grid = rowGrid,
  chosen = false,
  children,
}: {
  grid?: object;
  chosen?: boolean;
  children: ReactNode;
}) {
  return (
    <Box
      role="row"
      position="relative"
      {...grid}
      minHeight={rowMinHeight}
      borderBottom="1px solid"
      borderColor="rule"
      paddingY={{ base: '10px', lg: 0 }}
      bg={chosen ? 'target' : undefined}
      boxShadow={chosen ? 'inset 4px 0 0 var(--chakra-colors-ink)' : undefined}
      _hover={{ bg: 'target' }}
    >
      {children}
    </Box>
  );
}

/** How many notes stand on the sheet; where somebody else wrote since it was read last, how many of them. */
function NotesCount({ take: { notes, newNotes } }: { take: TakeListItem }) {
  if (notes === 0) return null;
  return (
    <chakra.span
      fontSize="small"
      lineHeight="20px"
      whiteSpace="nowrap"
      fontWeight={newNotes > 0 ? 600 : 400}
      marginRight={{ base: 0, lg: '12px' }}
    >
      {newNotes > 0 ? `${newNotes} new` : notes}
      <chakra.span srOnly> {(newNotes || notes) === 1 ? 'note' : 'notes'}</chakra.span>
    </chakra.span>
  );
}

function Says({ take, failure }: { take: TakeListItem; failure?: string }) {
  const { status, strong, rest } = take.summary ?? {
    status: 'fix' as const,
    ...unmeasuredWords(take.measurement),
  };
  return (
    <Flex
      role="cell"
      gridArea="says"
      alignItems={{ base: 'flex-start', lg: 'center' }}
      gap="10px"
      paddingRight="6px"
      paddingY={{ base: '6px', lg: '2px' }}
      minWidth={0}
      fontSize="16px"
      lineHeight="21px"
    >
      <StatusMark status={status} sizePx={22} />
      <chakra.span srOnly>{statusWords[status]}: </chakra.span>
      <span role={failure ? 'alert' : undefined}>
        {status !== 'good' && <b>{strong}</b>}
        {status === 'good' && strong} {failure || rest}
      </span>
    </Flex>
  );
}

export function ActionCell({ children }: { children: ReactNode }) {
  return (
    <Flex
      role="cell"
      gridArea="action"
      justifyContent="flex-end"
      alignItems={{ base: 'flex-start', lg: 'center' }}
    >
      {children}
    </Flex>
  );
}

/** Lies above the row's link; its touch area is larger than the word. */
export const RowAction = chakra(TextButton, {
  base: {
    position: 'relative',
    zIndex: 1,
    fontSize: 'caption',
    color: 'ink.muted',
    textDecoration: 'none',
    marginRight: { base: 0, lg: '12px' },
    _hover: { color: 'ink', textDecoration: 'underline' },
    _after: { content: '""', position: 'absolute', inset: '-13px -12px' },
  },
});
