import { Box } from '@chakra-ui/react';
import type { ShareSubject } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { ShareDialog } from './ShareDialog';
import { ShareList } from './ShareList';

/** At the head of the margin: send the sheet to somebody who can help, and what became of the links. */
export function SendSheet({ takeId }: { takeId: string }) {
  const subject: ShareSubject = { kind: 'take', takeId };
  const [open, setOpen] = useState(false);
  return (
    <Box paddingLeft={{ base: 0, lg: '20px' }} _print={{ display: 'none' }}>
      <Button type="button" look="outline" onClick={() => setOpen(true)}>
        Send this sheet
      </Button>
      <ShareList subject={subject} />
      {open && <ShareDialog subject={subject} onClose={() => setOpen(false)} />}
    </Box>
  );
}
