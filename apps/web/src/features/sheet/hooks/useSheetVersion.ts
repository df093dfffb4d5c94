import type { TakeResponse } from '@thudline/contracts';
import { useSearchParams } from 'react-router-dom';

const param = 'version';

/** Which version of the sheet is looked at; kept in the address. The newest one where it names none that there is. */
export function useSheetVersion(take: TakeResponse | undefined) {
  const [params, setParams] = useSearchParams();
  const versions = take?.sheetVersions ?? [];
  const asked = versions.find(({ version }) => version === params.get(param));
  const newest = versions.at(0)?.version;
  return {
    version: asked?.version ?? newest,
    newest,
    show: (version: string) =>
      setParams(version === newest ? {} : { [param]: version }, { replace: true, preventScrollReset: true }),
  };
}
