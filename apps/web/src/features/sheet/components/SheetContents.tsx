import { Flex, chakra } from '@chakra-ui/react';
import type { FindingStatus } from '@thudline/contracts';
import { statusColor } from '../../../components/StatusMark';
import { NotePlace } from '../notePlaces';

export interface ContentsEntry {
  id: string;
  title: string;
  word?: string;
  status?: FindingStatus;
}

/** The names of the sections with what each says; a click goes there. */
export function SheetContents({ entries }: { entries: ContentsEntry[] }) {
  return (
    <chakra.nav
      aria-label="On this sheet"
      marginTop="20px"
      borderY="1px solid"
      borderColor="rule"
      paddingY="9px"
      _print={{ display: 'none' }}
    >
      <Flex as="ul" listStyleType="none" columnGap="20px" rowGap="4px" wrap="wrap" fontSize="small">
        {entries.map((entry) => (
          <li key={entry.id}>
            <chakra.a href={`#${entry.id}`} display="inline-block" paddingY="3px">
              <chakra.b fontWeight={600}>{entry.title}</chakra.b>
              {entry.word && entry.status && (
                <chakra.span color={statusColor(entry.status)}> {entry.word}</chakra.span>
              )}
            </chakra.a>
          </li>
        ))}
        <NotePlace as="li" name="contents" />
      </Flex>
    </chakra.nav>
  );
}
