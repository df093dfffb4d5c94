import { useMe } from '../features/auth/hooks/useMe';
import { CheckTakeSheet } from '../features/first-run/components/CheckTakeSheet';
import { usePageTitle } from '../lib/usePageTitle';

/** What to play for a take that everything can be measured on. */
export function CheckTakePage() {
  usePageTitle('The check take');
  const { me } = useMe();
  return <CheckTakeSheet signedIn={!!me} />;
}
