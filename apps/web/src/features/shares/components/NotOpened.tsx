import { ApiError } from '../../../lib/apiClient';
import { AskPassphrase } from './AskPassphrase';
import { GuestFailure } from './GuestFailure';

/** A link that did not open by itself: it asks for a passphrase, has ended, or could not be asked. */
export function NotOpened({
  error,
  retry,
  openWith,
}: {
  error: Error;
  retry: () => void;
  openWith: (passphrase: string) => Promise<void>;
}) {
  if (error instanceof ApiError && error.code === 'passphrase-needed')
    return <AskPassphrase openWith={openWith} />;
  return <GuestFailure error={error} retry={retry} />;
}
