import { PageLoading } from '../components/PageLoading';
import { PageTitle } from '../components/PageTitle';
import { useMe } from '../features/auth/hooks/useMe';
import { LinksSheet } from '../features/shares/components/LinksSheet';

/** Every link of the player's in one place. */
export function LinksPage() {
  const { me } = useMe();
  if (!me) return <PageLoading />;
  return (
    <>
      <PageTitle>My links</PageTitle>
      <LinksSheet readOnly={me.readOnly} />
    </>
  );
}
