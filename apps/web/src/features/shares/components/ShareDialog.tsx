import type { CreatedShareResponse, ShareSubject } from '@thudline/contracts';
import { useState } from 'react';
import { Dialog } from '../../../components/Dialog';
import { subjectWords } from '../subjectWords';
import { CreatedShare } from './CreatedShare';
import { MailedShare } from './MailedShare';
import { ShareForm } from './ShareForm';

/** First what the link allows, then the link itself. */
export function ShareDialog({ subject, onClose }: { subject: ShareSubject; onClose: () => void }) {
  const [created, setCreated] = useState<CreatedShareResponse | null>(null);
  if (!created)
    return (
      <Dialog title={`Send this ${subjectWords[subject.kind].thing}`} onClose={onClose}>
        <ShareForm subject={subject} onCreated={setCreated} />
      </Dialog>
    );
  return (
    <Dialog title={created.url ? 'The link is ready' : 'The mail is on its way'} onClose={onClose}>
      {created.url ? (
        <CreatedShare share={created} url={created.url} onDone={onClose} />
      ) : (
        <MailedShare share={created} onDone={onClose} />
      )}
    </Dialog>
  );
}
