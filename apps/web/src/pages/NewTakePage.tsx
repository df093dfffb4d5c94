import { useSearchParams } from 'react-router-dom';
import { PageTitle } from '../components/PageTitle';
import { useTakesFitting } from '../features/takes/hooks/useTakes';
import { everyTake } from '../features/takes/takesQuery';
import { NewTakeSheet } from '../features/upload/components/NewTakeSheet';

/** The list tells whether this is the first take, and which one came before; adding one works without its answer. */
export function NewTakePage() {
  const [params] = useSearchParams();
  const { page, error } = useTakesFitting(everyTake, 1);
  const firstTake = page ? page.everyTotal === 0 : error ? false : undefined;
  return (
    <>
      <PageTitle>Add a take</PageTitle>
      <NewTakeSheet
        firstTake={firstTake}
        followsTakeId={params.get('follows') ?? page?.items[0]?.id ?? null}
      />
    </>
  );
}
