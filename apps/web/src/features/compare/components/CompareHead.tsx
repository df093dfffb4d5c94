import { Box, Flex } from '@chakra-ui/react';
import type { ComparedTake, ComparisonResponse } from '@thudline/contracts';
import { useNavigate } from 'react-router-dom';
import { InlineSelect } from '../../../components/InlineSelect';
import { TextLink } from '../../../components/TextLink';
import { useTakeNames } from '../hooks/useTakeNames';
import { comparePath, takeWords } from '../takeWords';

/** "Compare **take 14** with **take 15**": either can be exchanged for another, or the two swapped. */
export function CompareHead({ before, after }: Pick<ComparisonResponse, 'before' | 'after'>) {
  const navigate = useNavigate();
  const listed = useTakeNames();
  const select = (label: string, value: ComparedTake, path: (id: string) => string) => {
    const names = new Map([...listed, value].map((take) => [take.id, takeWords(take)]));
    return (
      <InlineSelect
        label={label}
        value={value.id}
        options={[...names.keys()]}
        words={(id) => names.get(id) ?? ''}
        onChange={(id) => void navigate(path(id))}
      />
    );
  };
  return (
    <Flex columnGap="18px" rowGap="4px" wrap="wrap" alignItems="baseline" color="ink.muted" lineHeight="30px">
      <Box flex="1 1 0" minWidth={{ base: '100%', md: 0 }} css={{ '& > span': { color: 'ink' } }}>
        Compare {select('Take before', before, (id) => comparePath(id, after.id))} with{' '}
        {select('Take after', after, (id) => comparePath(before.id, id))}
      </Box>
      <TextLink to={comparePath(after.id, before.id)} fontSize="small" _print={{ display: 'none' }}>
        swap them
      </TextLink>
    </Flex>
  );
}
