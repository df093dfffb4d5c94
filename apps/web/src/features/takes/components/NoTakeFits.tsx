import { Box, chakra } from '@chakra-ui/react';
import type { ListTakesResponse, Target } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { plural } from '../../../lib/format';
import { nothingWords, queryWords, widerQueries } from '../filterWords';
import { useTakesFitting } from '../hooks/useTakes';
import { everyTake, takesAddress, type TakesQuery } from '../takesQuery';
import { RowPicture, LevelBand } from './LevelPicture';
import { LowEndZero } from './LowEndPicture';
import { rowGrid } from './tableGrid';
import { TableFrame } from './TakesTable';

/** The sentence fits no take: says so, and offers wider sentences with what they hold. */
export function NoTakeFits({
  query,
  page,
  target,
}: {
  query: TakesQuery;
  page: ListTakesResponse;
  target: Target;
}) {
  return (
    <Box position="relative">
      <Box aria-hidden>
        <TableFrame target={target}>
          <Box
            {...rowGrid}
            gridTemplateAreas={{ base: '"box"', lg: rowGrid.gridTemplateAreas.lg }}
            minHeight="264px"
          >
            <Box gridArea="level" position="relative" display={{ base: 'none', lg: 'block' }}>
              <RowPicture>
                <LevelBand target={target} />
              </RowPicture>
            </Box>
            <Box gridArea="low" position="relative" display={{ base: 'none', lg: 'block' }}>
              <RowPicture>
                <LowEndZero />
              </RowPicture>
            </Box>
          </Box>
        </TableFrame>
      </Box>
      <Box
        position="absolute"
        left={{ base: 0, lg: '40px', xl: '48px' }}
        top={{ base: '92px', lg: '110px' }}
        maxWidth={{ base: '100%', lg: '440px' }}
      >
        <chakra.h2
          role="status"
          fontSize={{ base: '22px', lg: '24px' }}
          lineHeight="30px"
          fontWeight={400}
          css={{ '& b': { fontWeight: 900 } }}
        >
          <b>No take fits that sentence.</b> {nothingWords(query)}
        </chakra.h2>
        <WiderSentences query={query} everyTotal={page.everyTotal} />
      </Box>
    </Box>
  );
}

function WiderSentences({ query, everyTotal }: { query: TakesQuery; everyTotal: number }) {
  return (
    <chakra.ul marginTop="16px" listStyleType="none" lineHeight="29px">
      {widerQueries(query).map((wider) => (
        <WiderSentence key={queryWords(wider)} query={wider} />
      ))}
      {everyTotal > 0 && <SentenceWithCount query={everyTake} total={everyTotal} />}
    </chakra.ul>
  );
}

/** Offered once its count is known and it holds something. */
function WiderSentence({ query }: { query: TakesQuery }) {
  const { page } = useTakesFitting(query, 1);
  if (!page || page.total === 0) return null;
  return <SentenceWithCount query={query} total={page.total} />;
}

function SentenceWithCount({ query, total }: { query: TakesQuery; total: number }) {
  return (
    <li>
      <TextLink to={takesAddress(query)} fontWeight={600}>
        {queryWords(query)}
      </TextLink>{' '}
      <chakra.span color="ink.muted">{plural(total, 'take')}</chakra.span>
    </li>
  );
}
