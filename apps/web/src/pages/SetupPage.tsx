import { useParams } from 'react-router-dom';
import { PageLoading } from '../components/PageLoading';
import { useMe } from '../features/auth/hooks/useMe';
import { KeptSetup } from '../features/setups/components/KeptSetup';
import { SetupError } from '../features/setups/components/SetupError';
import { useSetup } from '../features/setups/hooks/useSetups';
import { usePageTitle } from '../lib/usePageTitle';

/** One setup. */
export function SetupPage() {
  const { setupId = '' } = useParams();
  const { me } = useMe();
  const { setup, error, retry } = useSetup(setupId);
  usePageTitle(setup?.name ?? 'Setup');
  if (error) return <SetupError error={error} onRetry={retry} />;
  if (!setup || !me) return <PageLoading />;
  return <KeptSetup key={setup.id} setup={setup} settings={me.settings} canChange={!me.readOnly} />;
}
