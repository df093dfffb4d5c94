import { Headline } from '../../../components/Headline';
import { SheetPaper } from '../../../components/SheetPaper';
import { plural } from '../../../lib/format';
import { accountsWords } from '../adminWords';
import { useEveryAccount } from '../hooks/useAccounts';
import { useFailedWork } from '../hooks/useFailedWork';
import { useInstallation } from '../hooks/useInstallation';
import { AccountsSection } from './AccountsSection';
import { AuditSection } from './AuditSection';
import { ComplaintsSection } from './ComplaintsSection';
import { InstallationSection } from './InstallationSection';
import { WorkSection } from './WorkSection';

/** For whoever runs the installation: what needs them first, then everybody, then what happened. */
export function AdminSheet() {
  const every = useEveryAccount();
  const { work } = useFailedWork();
  const installation = useInstallation();
  return (
    <SheetPaper>
      <Headline>
        {work && <b>{work.length > 0 ? `${plural(work.length, 'thing')} failed.` : 'Nothing failed.'}</b>}{' '}
        {every ? accountsWords(every.total, every.bytes) : 'Counting the accounts…'}
      </Headline>
      <WorkSection />
      <ComplaintsSection />
      <AccountsSection limitBytes={installation.settings?.accountBytes} />
      <InstallationSection installation={installation} />
      <AuditSection />
    </SheetPaper>
  );
}
