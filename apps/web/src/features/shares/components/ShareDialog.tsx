import type { CreatedShareResponse, ShareSubject } from '@thudline/contracts';
import { useState } from 'react';
import { Dialog } from '../../../components/Dialog';
import { CreatedShare } from './CreatedShare';
import { ShareForm } from './ShareForm';

/** First what the link allows, then the link itself. */
export function ShareDialog({ subject, onClose }: { subject: ShareSubject; onClose: () => void }) {
  const [created, setCreated] = useState<CreatedShareResponse | null>(null);
  return (
    <Dialog title={created ? 'The link is ready' : 'Send this sheet'} onClose={onClose}>
      {created ? (
        <CreatedShare share={created} onDone={onClose} />
      ) : (
        <ShareForm subject={subject} onCreated={setCreated} />
      )}
    </Dialog>
  );
}
