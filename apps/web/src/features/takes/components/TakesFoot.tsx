import { Flex } from '@chakra-ui/react';
import type { ListTakesResponse } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { TextLink } from '../../../components/TextLink';
import { plural } from '../../../lib/format';
import { pageAfter, rangeWords, type PagePlace } from '../paging';
import { everyTake, takesAddress, type TakesQuery } from '../takesQuery';

interface FootProps {
  query: TakesQuery;
  place: PagePlace;
  page: ListTakesResponse;
  /** What can be done to the chosen takes, where any are. */
  chosenBar: ReactNode;
}

/** Which rows these are, the way to further ones and to what was deleted. */
export function TakesFoot({ query, place, page, chosenBar }: FootProps) {
  const shownRows = page.items.length;
  return (
    <Flex
      wrap="wrap"
      justifyContent="space-between"
      alignItems="center"
      columnGap="24px"
      rowGap="12px"
      minHeight="44px"
      marginTop="12px"
      fontSize="16px"
      _print={{ display: 'none' }}
    >
      {chosenBar || <Besides query={query} page={page} />}
      <Flex
        as="nav"
        aria-label="Pages of takes"
        alignItems="baseline"
        columnGap="8px"
        marginLeft="auto"
        color="ink.muted"
      >
        {shownRows > 0 && rangeWords(place, shownRows, page.total)}
        {place.cursor && (
          <TextLink to={takesAddress(query)}>{query.order === 'newest' ? 'newest' : 'first page'}</TextLink>
        )}
        {page.nextCursor && (
          <TextLink to={pageAfter(query, { nextCursor: page.nextCursor, place, shownRows })}>
            {query.order === 'newest' ? 'older' : 'more'}
          </TextLink>
        )}
        {shownRows === 0 && <RestoreLink query={query} page={page} />}
      </Flex>
    </Flex>
  );
}

function Besides({ query, page }: Pick<FootProps, 'query' | 'page'>) {
  return (
    <Flex color="ink.muted" columnGap="8px" wrap="wrap">
      {page.items.length === 0 && query.show !== 'deleted' && `0 of ${plural(page.everyTotal, 'take')}`}
      {page.items.length > 0 && <RestoreLink query={query} page={page} />}
      {query.show === 'deleted' && (
        <>
          Deleted takes go for good after 30 days.{' '}
          <TextLink to={takesAddress(everyTake)}>back to every take</TextLink>
        </>
      )}
    </Flex>
  );
}

function RestoreLink({ query, page }: Pick<FootProps, 'query' | 'page'>) {
  if (page.deletedTotal === 0 || query.show === 'deleted') return null;
  return (
    <TextLink
      to={takesAddress({ ...everyTake, show: 'deleted' })}
      color="ink"
      display="inline-block"
      lineHeight="28px"
    >
      restore something deleted
    </TextLink>
  );
}
