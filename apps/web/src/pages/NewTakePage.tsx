import { PageTitle } from '../components/PageTitle';
import { useTakes } from '../features/takes/hooks/useTakes';
import { NewTakeSheet } from '../features/upload/components/NewTakeSheet';

/** The list only tells whether this is the first take; adding one works without its answer. */
export function NewTakePage() {
  const { page, error } = useTakes();
  const firstTake = page ? page.total === 0 : error ? false : undefined;
  return (
    <>
      <PageTitle>Add a take</PageTitle>
      <NewTakeSheet firstTake={firstTake} />
    </>
  );
}
