import { Box } from '@chakra-ui/react';
import type { PhoneLinkResponse } from '@thudline/contracts';
import { Button } from '../../../components/Button';
import { CopyField } from '../../../components/CopyField';
import { Dialog } from '../../../components/Dialog';
import { FieldError } from '../../../components/FieldError';
import { usePhoneLink } from '../hooks/usePhoneLink';
import { ScanCode } from './ScanCode';

/** The code to scan, for as long as it works. */
export function PhoneDialog({ onClose }: { onClose: () => void }) {
  const { phoneLink, again } = usePhoneLink();
  return (
    <Dialog title="Show on my phone" onClose={onClose}>
      <Box minHeight="470px" marginTop="10px">
        {phoneLink.state === 'ready' && <Ready link={phoneLink.link} />}
        {phoneLink.state === 'making' && <Box role="status">Making a code…</Box>}
        {phoneLink.state === 'failed' && <FieldError>{phoneLink.message}</FieldError>}
        {phoneLink.state === 'ended' && (
          <Box role="status">This code has ended; it works for minutes only.</Box>
        )}
        {(phoneLink.state === 'failed' || phoneLink.state === 'ended') && (
          <Button type="button" marginTop="16px" onClick={again}>
            Make a new code
          </Button>
        )}
      </Box>
    </Dialog>
  );
}

const hourMinute = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

function Ready({ link }: { link: PhoneLinkResponse }) {
  return (
    <>
      Point the phone’s camera at this. It shows what to do before the next take, very large, and every next
      take by itself.
      <Box marginTop="14px">
        <ScanCode text={link.url} label="Code to scan: opens Big print on a phone" />
      </Box>
      <Box marginTop="12px" fontSize="small" color="ink.muted">
        Works once, until {hourMinute.format(new Date(link.expiresAt))}. The phone can only read along:
        nothing can be changed from it.
      </Box>
      <Box marginTop="12px">
        <CopyField label="Or open this address on it" value={link.url} />
      </Box>
    </>
  );
}
