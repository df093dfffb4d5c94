import {
  installationSettings,
  paths,
  type InstallationSettings,
  type UpdateInstallationRequest,
} from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson, requestNothing } from '../../../lib/apiClient';
import { useRefusal } from '../../settings/hooks/useRefusal';

/** What whoever runs the installation decides. */
export function useInstallation() {
  const { data, error, mutate } = useSWR<InstallationSettings, Error>(paths.adminSettings, (path: string) =>
    requestJson(path, installationSettings),
  );
  const { refusal, act } = useRefusal(mutate);
  return {
    settings: data,
    error: errorToShow(data, error),
    retry: () => void mutate(),
    refusal,
    set: (body: UpdateInstallationRequest) =>
      act(() => requestJson(paths.adminSettings, installationSettings, { method: 'PATCH', body })),
    invite: (email: string) => requestNothing(paths.adminInvitations, { method: 'POST', body: { email } }),
  };
}
