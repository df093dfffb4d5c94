import { Box, chakra } from '@chakra-ui/react';
import { defaultUserSettings } from '@thudline/contracts';
import { TextLink } from '../../../components/TextLink';
import { useMe } from '../../auth/hooks/useMe';
import { useTakes } from '../hooks/useTakes';
import { useTakesAddress } from '../hooks/useTakesAddress';
import { useTakesBench } from '../hooks/useTakesBench';
import { takesAddress, type TakesQuery } from '../takesQuery';
import { ChosenBar } from './ChosenBar';
import { FilterSentence } from './FilterSentence';
import { NoTakeFits } from './NoTakeFits';
import { TakesEmpty } from './TakesEmpty';
import { TakesError } from './TakesError';
import { TakesFoot } from './TakesFoot';
import { TakesHeading } from './TakesHeading';
import { TakesLoading } from './TakesLoading';
import { TakesTable } from './TakesTable';
import { UndoBar } from './UndoBar';

/** All the player's takes, as a sentence asks for them, a page at a time. */
export function TakesSheet() {
  const { me } = useMe();
  const target = (me?.settings ?? defaultUserSettings).target;
  const { query, place, change, firstPage } = useTakesAddress();
  const { page, error, stale, retry } = useTakes(query, place.cursor);
  const bench = useTakesBench(page?.items ?? [], {
    deleted: query.show === 'deleted',
    onPageEmptied: place.cursor === null ? undefined : firstPage,
  });
  const { undo } = bench;
  const bar = undo.words && (
    <UndoBar
      words={undo.words}
      takesFocus={undo.takesFocus}
      failure={undo.failure}
      onUndo={undo.undo}
      onDismiss={undo.dismiss}
    />
  );
  if (page && page.everyTotal === 0 && query.show !== 'deleted')
    return (
      <>
        <TakesEmpty deletedTotal={page.deletedTotal} />
        {bar}
      </>
    );
  return (
    <Box marginX={{ base: 0, lg: '-24px' }} marginTop={{ base: 0, lg: '-3px' }}>
      <TakesHeading />
      <FilterSentence query={query} tags={page?.tags ?? []} setups={page?.setups ?? []} onChange={change} />
      {error && <TakesError message={error.message} onRetry={retry} />}
      {!page && !error && <TakesLoading target={target} />}
      {page && (
        <>
          {page.items.length > 0 && (
            <TakesTable
              takes={page.items}
              knownTags={page.tags}
              actions={me?.readOnly ? undefined : bench.actions}
              {...{ target, stale }}
            />
          )}
          {page.items.length === 0 && place.cursor && <NothingFurther query={query} />}
          {page.items.length === 0 && !place.cursor && <NoTakeFits {...{ query, page, target }} />}
          {bar}
          <TakesFoot
            {...{ query, place, page }}
            chosenBar={
              bench.chosen.length > 0 && (
                <ChosenBar
                  chosen={bench.chosen}
                  knownTags={page.tags}
                  onDelete={bench.removeChosen}
                  onRestore={query.show === 'deleted' ? bench.restoreChosen : undefined}
                  onTag={bench.tagChosen}
                  onSetUp={bench.setUpChosen}
                  onClear={bench.clear}
                />
              )
            }
          />
        </>
      )}
      {!page && bar}
    </Box>
  );
}

function NothingFurther({ query }: { query: TakesQuery }) {
  return (
    <chakra.p marginTop="24px" paddingTop="16px" borderTop="1px solid" borderColor="rule">
      There is nothing further on. <TextLink to={takesAddress(query)}>Go to the first page</TextLink>
    </chakra.p>
  );
}
