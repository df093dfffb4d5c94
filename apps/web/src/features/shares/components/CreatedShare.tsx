import { Box, Flex } from '@chakra-ui/react';
import type { CreatedShareResponse } from '@thudline/contracts';
import { Button } from '../../../components/Button';
import { CopyField } from '../../../components/CopyField';
import { openUntilWords } from '../openUntilWords';
import { mayDoWords } from '../shareWords';

/** The link, told this once. */
export function CreatedShare({
  share,
  url,
  onDone,
}: {
  share: CreatedShareResponse;
  url: string;
  onDone: () => void;
}) {
  return (
    <Box marginTop="12px">
      <Box>
        <b>Copy it now: it is told only this once.</b> Whoever has it can {mayDoWords(share)}
        {share.hasPassphrase && ' once they give the passphrase'}; it stays {openUntilWords(share)}. You can
        end it at any time.
      </Box>
      <Box marginTop="16px">
        <CopyField label="Address of the link" value={url} />
      </Box>
      <Flex marginTop="12px" gap="14px" wrap="wrap">
        <SendOn url={url} />
        <Button type="button" look="outline" onClick={onDone}>
          Done
        </Button>
      </Flex>
    </Box>
  );
}

/** Phones can hand an address to whatever their owner writes with. */
function SendOn({ url }: { url: string }) {
  if (!('share' in navigator)) return null;
  const send = async () => {
    try {
      await navigator.share({ url });
    } catch (error) {
      // Closing the phone's own list is no failure; the address is still there to copy.
      if (!(error instanceof DOMException)) throw error;
    }
  };
  return (
    <Button type="button" onClick={() => void send()}>
      Send it with…
    </Button>
  );
}
