import { Flex, chakra } from '@chakra-ui/react';
import { takeFilters, takeOrders, type NamedSetup } from '@thudline/contracts';
import { InlineSelect } from '../../../components/InlineSelect';
import { filterWords, orderWords } from '../filterWords';
import type { TakesQuery } from '../takesQuery';
import { FindBox } from './FindBox';

const any = '';

/** "Show **every take** tagged **any tag** with setup **any setup**, **newest first**." and a place to look for words. */
export function FilterSentence({
  query,
  tags,
  setups,
  onChange,
}: {
  query: TakesQuery;
  tags: readonly string[];
  setups: readonly NamedSetup[];
  onChange: (change: Partial<TakesQuery>) => void;
}) {
  const known = query.tag && !tags.includes(query.tag) ? [...tags, query.tag] : tags;
  return (
    <Flex
      as="section"
      aria-label="Which takes"
      wrap="wrap"
      justifyContent="space-between"
      alignItems="flex-start"
      columnGap="24px"
      rowGap="4px"
      marginTop={{ base: '14px', lg: '6px' }}
      _print={{ display: 'none' }}
    >
      <chakra.div lineHeight={{ base: '40px', lg: '32px' }} maxWidth="100%">
        Show{' '}
        <InlineSelect
          label="Show"
          value={query.show}
          options={takeFilters}
          words={(show) => filterWords[show]}
          onChange={(show) => onChange({ show })}
        />
        {known.length > 0 && (
          <>
            {' '}
            tagged{' '}
            <InlineSelect
              label="Tagged"
              value={query.tag ?? any}
              options={[any, ...known]}
              words={(tag) => tag || 'any tag'}
              onChange={(tag) => onChange({ tag: tag || null })}
            />
          </>
        )}
        {(setups.length > 0 || query.setup) && (
          <>
            {' '}
            with setup{' '}
            <InlineSelect
              label="With setup"
              value={query.setup ?? any}
              options={setupOptions(setups, query.setup)}
              words={(id) => setupWords(setups, id)}
              onChange={(id) => onChange({ setup: id || null })}
            />
          </>
        )}
        {' , '}
        <InlineSelect
          label="In which order"
          value={query.order}
          options={takeOrders}
          words={(order) => orderWords[order]}
          onChange={(order) => onChange({ order })}
        />
      </chakra.div>
      <FindBox find={query.find} onFind={(find) => onChange({ find })} />
    </Flex>
  );
}

function setupOptions(setups: readonly NamedSetup[], asked: string | null): string[] {
  const ids = setups.map(({ id }) => id);
  return [any, ...ids, ...(asked && !ids.includes(asked) ? [asked] : [])];
}

const setupWords = (setups: readonly NamedSetup[], id: string) =>
  id === any ? 'any setup' : (setups.find((setup) => setup.id === id)?.name ?? 'one that no take has');
