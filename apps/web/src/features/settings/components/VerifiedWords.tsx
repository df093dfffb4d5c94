import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { useAccountLinks } from '../../auth/hooks/useAccountLinks';

type Sending = 'no' | 'underway' | 'sent' | { failure: string };

/** "verified", or "not verified yet: send it again". */
export function VerifiedWords({ verified }: { verified: boolean }) {
  const { resendVerification } = useAccountLinks();
  const [sending, setSending] = useState<Sending>('no');
  const send = async () => {
    setSending('underway');
    try {
      await resendVerification();
      setSending('sent');
    } catch (error) {
      setSending({ failure: error instanceof Error ? error.message : 'It could not be sent. Try again.' });
    }
  };
  return (
    <Box role="status" fontSize="small" color="ink.muted" marginTop="6px">
      {verified && 'verified'}
      {!verified && sending === 'sent' && 'A mail with a link is on its way.'}
      {!verified && sending === 'underway' && 'Sending…'}
      {!verified && sending !== 'sent' && sending !== 'underway' && (
        <>
          {sending !== 'no' && `${sending.failure} `}not verified yet:{' '}
          <TextButton color="ink" minHeight="26px" onClick={() => void send()}>
            send it again
          </TextButton>
        </>
      )}
    </Box>
  );
}
