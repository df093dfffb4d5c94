import { chakra } from '@chakra-ui/react';
import type { ReportResponse, TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { InlineSelect } from '../../../components/InlineSelect';
import { date } from '../../../lib/format';
import { useSheetVersion } from '../hooks/useSheetVersion';
import { useTakeEdits } from '../hooks/useTakeEdits';

/** With which version of the measurements, and when; its player can look at the versions before. */
export function MeasuredWith({ take, report }: { take: TakeResponse; report: ReportResponse }) {
  const { newest, show } = useSheetVersion(take);
  const versions = take.sheetVersions.map(({ version }) => version);
  const words = (version: string) => {
    const measuredAt = take.sheetVersions.find((each) => each.version === version)?.measuredAt ?? '';
    return `as measured on ${date(measuredAt)}, version ${version}`;
  };
  return (
    <chakra.div
      fontSize="caption"
      color="ink.muted"
      lineHeight={{ base: '21px', _print: '16px' }}
      marginTop={{ base: '7px', _print: 0 }}
    >
      Measured {date(report.measuredAt)} with version {report.dspVersion} of the measurements.
      {versions.length > 1 && (
        <chakra.div color="ink" fontSize="small" lineHeight="34px" _print={{ display: 'none' }}>
          Show this sheet{' '}
          <InlineSelect
            label="Version of the sheet"
            value={report.dspVersion}
            options={versions}
            words={words}
            onChange={show}
          />
        </chakra.div>
      )}
      {report.dspVersion === newest && <Renewal take={take} />}
    </chakra.div>
  );
}

/** What becomes of a sheet that an earlier version made. */
function Renewal({ take }: { take: TakeResponse }) {
  if (take.renewal === 'waiting')
    return (
      <chakra.div role="status" _print={{ display: 'none' }}>
        The measurements have changed since. This take is measured again by itself; the sheet then changes
        here.
      </chakra.div>
    );
  if (take.renewal === 'failed') return <FailedRenewal take={take} />;
  return null;
}

function FailedRenewal({ take }: { take: TakeResponse }) {
  const { measureAgain } = useTakeEdits(take);
  const [failure, setFailure] = useState('');
  const again = async () => {
    try {
      await measureAgain();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'That did not work. Try again.');
    }
  };
  return (
    <chakra.div _print={{ display: 'none' }}>
      The measurements have changed since, but this take could not be measured again; the sheet stays as it
      is. {take.rights.change && <TextButton onClick={() => void again()}>Measure it again</TextButton>}{' '}
      {failure && <span role="alert">{failure}</span>}
    </chakra.div>
  );
}
