import { PageLoading } from '../components/PageLoading';
import { PageTitle } from '../components/PageTitle';
import { SheetPaper } from '../components/SheetPaper';
import { useMe } from '../features/auth/hooks/useMe';
import { SetupsSheet } from '../features/setups/components/SetupsSheet';

/** The list of setups. */
export function SetupsPage() {
  const { me } = useMe();
  if (!me) return <PageLoading />;
  return (
    <SheetPaper>
      <PageTitle>Setups</PageTitle>
      <SetupsSheet settings={me.settings} canChange={!me.readOnly} />
    </SheetPaper>
  );
}
