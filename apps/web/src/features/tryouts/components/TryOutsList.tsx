import { Box, chakra } from '@chakra-ui/react';
import type { TryOutListItem } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { plural } from '../../../lib/format';
import type { LengthUnit } from '../positionWords';
import { placeName } from '../rows';
import { subjectWords } from '../subjectWords';

const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short' });
const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** Every try-out: what differs, how many takes, and who won. */
export function TryOutsList({
  items,
  lengthUnit,
}: {
  items: readonly TryOutListItem[];
  lengthUnit: LengthUnit;
}) {
  return (
    <chakra.ul
      aria-label="Try-outs"
      listStyleType="none"
      marginTop="16px"
      borderTop="1px solid"
      borderColor="rule"
    >
      {items.map((item) => (
        <chakra.li
          key={item.id}
          display="grid"
          gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 110px 220px 70px' }}
          columnGap="16px"
          alignItems="baseline"
          paddingY="11px"
          borderBottom="1px solid"
          borderColor="rule"
        >
          <Box fontWeight={600}>
            <TextLink to={`/tryouts/${item.id}`}>{capital(subjectWords(item).differs)}</TextLink>
          </Box>
          <Box color="ink.muted">{plural(item.takeCount, 'take')}</Box>
          <Box>{item.winner ? `${placeName(item.winner, item, lengthUnit)} won` : 'no winner yet'}</Box>
          <Box color="ink.muted">{day.format(new Date(item.createdAt))}</Box>
        </chakra.li>
      ))}
    </chakra.ul>
  );
}
