import { Box } from '@chakra-ui/react';
import type { ShareSubject } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { subjectWords } from '../subjectWords';
import { ShareDialog } from './ShareDialog';
import { ShareList } from './ShareList';

/** At the head of the margin: send it to somebody who can help, and what became of the links. */
export function SendThis({ subject, inset = true }: { subject: ShareSubject; inset?: boolean }) {
  const [open, setOpen] = useState(false);
  return (
    <Box paddingLeft={inset ? { base: 0, lg: '20px' } : 0} _print={{ display: 'none' }}>
      <Button type="button" look="outline" onClick={() => setOpen(true)}>
        Send this {subjectWords[subject.kind].thing}
      </Button>
      <ShareList subject={subject} />
      {open && <ShareDialog subject={subject} onClose={() => setOpen(false)} />}
    </Box>
  );
}
