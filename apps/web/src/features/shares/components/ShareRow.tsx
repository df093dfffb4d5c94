import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ShareResponse } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import { Button, TextButton } from '../../../components/Button';
import { useShareActions } from '../hooks/useShareActions';
import { openedWords, rightsWords } from '../shareWords';

/** One link: its question, when it was opened, until when it opens, and the way to end it. */
export function ShareRow({ share, now }: { share: ShareResponse; now: Date }) {
  const [asking, setAsking] = useState(false);
  return (
    <chakra.li marginTop="8px" overflowWrap="anywhere">
      {share.question && <Box color="ink">“{share.question}”</Box>}
      <Box>
        {openedWords(share, now)} {rightsWords(share)}{' '}
        {!asking && <TextButton onClick={() => setAsking(true)}>End this link</TextButton>}
      </Box>
      {asking && <EndQuestion share={share} onKeep={() => setAsking(false)} />}
    </chakra.li>
  );
}

function EndQuestion({ share, onKeep }: { share: ShareResponse; onKeep: () => void }) {
  const { end } = useShareActions(share.subject);
  const keep = useRef<HTMLButtonElement>(null);
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState('');
  useEffect(() => keep.current?.focus(), []);
  const endIt = async () => {
    setBusy(true);
    try {
      await end(share.id);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'Ending it did not work. Try again.');
      setBusy(false);
    }
  };
  return (
    <Box
      padding="10px 12px 12px"
      marginTop="6px"
      bg="target"
      boxShadow="inset 3px 0 0 var(--chakra-colors-fix)"
      onKeyDown={(event) => event.key === 'Escape' && !busy && onKeep()}
    >
      <Box role="alert" color="ink" fontSize="small">
        {failure || (
          <>
            <b>End this link?</b> Whoever has it can’t open the sheet any more.
          </>
        )}
      </Box>
      <Flex gap="10px" marginTop="8px" wrap="wrap">
        <Button type="button" disabled={busy} onClick={() => void endIt()}>
          {busy ? 'Ending…' : 'End it'}
        </Button>
        <Button type="button" look="outline" ref={keep} disabled={busy} onClick={onKeep}>
          Keep it
        </Button>
      </Flex>
    </Box>
  );
}
