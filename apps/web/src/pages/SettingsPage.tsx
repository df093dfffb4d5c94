import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { PageTitle } from '../components/PageTitle';
import { useMe } from '../features/auth/hooks/useMe';
import { SettingsSheet } from '../features/settings/components/SettingsSheet';

/** Everything that is the player's own to set, and the ways out: an archive of everything, and deleting the account. */
export function SettingsPage() {
  const { me } = useMe();
  if (!me) return <PageLoading />;
  if (me.readOnly)
    return (
      <PageMessage
        strong="This phone reads along."
        rest="Settings are changed where you are signed in yourself."
      >
        <ButtonLink to="/takes">Go to your takes</ButtonLink>
      </PageMessage>
    );
  return (
    <>
      <PageTitle>Settings</PageTitle>
      <SettingsSheet me={me} />
    </>
  );
}
