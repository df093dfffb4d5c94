import { Box, chakra } from '@chakra-ui/react';
import type { TakeListItem } from '@thudline/contracts';
import { Link } from 'react-router-dom';
import { relativeDate } from '../relativeDate';

const RowLink = chakra(Link, {
  base: { textDecoration: 'none', '[role=row]:hover &': { textDecoration: 'underline' } },
});

/** Number, title, date and tags; the link to the sheet reaches over the whole row. */
export function TakeCell({ take, now }: { take: TakeListItem; now: Date }) {
  const name = (
    <>
      <chakra.b marginRight="9px">{take.number}</chakra.b>
      {take.title || 'no title'}
    </>
  );
  return (
    <Box role="cell" gridArea="take" alignSelf="center" paddingRight="16px" minWidth={0} paddingY="2px">
      <chakra.span
        display="block"
        fontSize="16px"
        lineHeight="22px"
        overflowWrap="anywhere"
        lineClamp={{ base: 2, lg: 1 }}
        title={take.title}
      >
        {take.deletedAt ? (
          name
        ) : (
          <RowLink to={`/takes/${take.id}`}>
            {name}
            <Box as="span" position="absolute" inset="0" />
          </RowLink>
        )}
      </chakra.span>
      <chakra.span
        display="block"
        fontSize="caption"
        lineHeight="18px"
        color="ink.muted"
        overflowWrap="anywhere"
        lineClamp={{ base: 2, lg: 1 }}
        title={take.tags.join(', ') || undefined}
      >
        <time dateTime={take.recordedAt}>{relativeDate(take.recordedAt, now)}</time>
        {take.tags.map((tag) => ` · ${tag}`)}
      </chakra.span>
    </Box>
  );
}
