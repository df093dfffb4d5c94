import { meResponse, paths, type MeResponse, type UpdateMeRequest } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson } from '../../../lib/apiClient';
import { isTakesKey } from '../../takes/hooks/takesKeys';

/** What a sheet says depends on target and temperature; it is worked out anew when it is read. */
const isReportKey = (key: unknown) =>
  typeof key === 'string' && key.startsWith(`${paths.takes}/`) && key.endsWith('/report');

/** Changes name or settings, shown at once and taken back if they could not be kept. */
export function useUpdateMe() {
  const { mutate } = useSWRConfig();
  return async (body: UpdateMeRequest) => {
    await mutate<MeResponse | null>(paths.me, requestJson(paths.me, meResponse, { method: 'PATCH', body }), {
      optimisticData: (me) => (me ? changed(me, body) : null),
      rollbackOnError: true,
      revalidate: false,
    });
    if (body.settings?.target || body.settings?.temperatureC !== undefined)
      await mutate((key) => isTakesKey(key) || isReportKey(key));
  };
}

const changed = (me: MeResponse, { name, settings }: UpdateMeRequest): MeResponse => ({
  ...me,
  name: name ?? me.name,
  settings: { ...me.settings, ...settings },
});
