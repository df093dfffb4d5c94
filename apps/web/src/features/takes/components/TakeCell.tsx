import { Box, chakra } from '@chakra-ui/react';
import type { TakeListItem } from '@thudline/contracts';
import { Link } from 'react-router-dom';
import { relativeDate } from '../relativeDate';

const RowLink = chakra(Link, {
  base: { textDecoration: 'none', '[role=row]:hover &': { textDecoration: 'underline' } },
});

/** Number, title and date; the link to the sheet reaches over the whole row. */
export function TakeCell({ take, now }: { take: TakeListItem; now: Date }) {
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
        <RowLink to={`/takes/${take.id}`}>
          <chakra.b marginRight="9px">{take.number}</chakra.b>
          {take.title || 'no title'}
          <Box as="span" position="absolute" inset="0" />
        </RowLink>
      </chakra.span>
      <chakra.time
        display="block"
        dateTime={take.recordedAt}
        fontSize="caption"
        lineHeight="18px"
        color="ink.muted"
      >
        {relativeDate(take.recordedAt, now)}
      </chakra.time>
    </Box>
  );
}
