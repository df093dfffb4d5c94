import type { SetupFields } from '@thudline/contracts';
import { useLocation, useSearchParams } from 'react-router-dom';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { PageTitle } from '../components/PageTitle';
import { useMe } from '../features/auth/hooks/useMe';
import { NewSetup } from '../features/setups/components/NewSetup';
import { SetupError } from '../features/setups/components/SetupError';
import { useSetup } from '../features/setups/hooks/useSetups';
import { fieldsOf } from '../features/setups/hooks/useSetupDraft';

/** A setup from nothing, or one that begins as a copy of another (`?from=`). */
export function NewSetupPage() {
  const [params] = useSearchParams();
  const { me } = useMe();
  const fromId = params.get('from');
  const { setup, error, retry } = useSetup(fromId);
  const written = (useLocation().state as { fields?: SetupFields } | null)?.fields;
  if (error) return <SetupError error={error} onRetry={retry} />;
  if (!me || (fromId && !setup)) return <PageLoading />;
  if (me.readOnly)
    return (
      <PageMessage
        strong="This phone reads along."
        rest="Setups are written where you are signed in yourself."
      >
        <ButtonLink to="/setups">Go to your setups</ButtonLink>
      </PageMessage>
    );
  const begun = setup && { ...(written ?? fieldsOf(setup)), name: '' };
  return (
    <>
      <PageTitle>New setup</PageTitle>
      <NewSetup key={fromId} from={setup ?? null} begun={begun} settings={me.settings} />
    </>
  );
}
