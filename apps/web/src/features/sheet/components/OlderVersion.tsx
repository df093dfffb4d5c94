import { chakra } from '@chakra-ui/react';
import type { ReportResponse, TakeResponse } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { date } from '../../../lib/format';
import { useSheetVersion } from '../hooks/useSheetVersion';

/** Stands above the line of a sheet that isn't the newest there is of its take. */
export function OlderVersion({ take, report }: { take: TakeResponse; report: ReportResponse }) {
  const { newest, show } = useSheetVersion(take);
  if (newest === undefined || report.dspVersion === newest) return null;
  return (
    <chakra.p role="status" fontSize="small" lineHeight="24px" marginBottom="12px">
      <b>This is an older sheet</b>, as version {report.dspVersion} of the measurements made it on{' '}
      {date(report.measuredAt)}. Lists, links and what became of a change go by the newest.{' '}
      <TextButton onClick={() => show(newest)} _print={{ display: 'none' }}>
        Show the newest
      </TextButton>
    </chakra.p>
  );
}
