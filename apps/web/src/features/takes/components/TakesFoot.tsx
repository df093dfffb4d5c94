import { Flex } from '@chakra-ui/react';
import { TextLink } from '../../../components/TextLink';
import { olderPage, rangeWords, type PagePlace } from '../paging';

/** Which rows these are, and the way to older ones. */
export function TakesFoot({
  place,
  shownRows,
  total,
  nextCursor,
}: {
  place: PagePlace;
  shownRows: number;
  total: number;
  nextCursor: string | null;
}) {
  return (
    <Flex
      as="nav"
      aria-label="Pages of takes"
      justifyContent="flex-end"
      alignItems="baseline"
      gap="8px"
      marginTop="20px"
      fontSize="16px"
      color="ink.muted"
    >
      {rangeWords(place, shownRows, total)}
      {place.cursor && <TextLink to="/takes">newest</TextLink>}
      {nextCursor && <TextLink to={olderPage(nextCursor, place, shownRows)}>older</TextLink>}
    </Flex>
  );
}
