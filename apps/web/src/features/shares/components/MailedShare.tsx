import { Box } from '@chakra-ui/react';
import type { CreatedShareResponse } from '@thudline/contracts';
import { Button } from '../../../components/Button';
import { openUntilWords } from '../openUntilWords';

/** What becomes of a link that is mailed. */
export function MailedShare({ share, onDone }: { share: CreatedShareResponse; onDone: () => void }) {
  return (
    <Box marginTop="12px">
      <b>It goes to {share.mailedTo}.</b> The link stays {openUntilWords(share)}.{' '}
      {share.hasPassphrase && 'Tell them the passphrase yourself: the mail doesn’t hold it. '}
      You see here when it is opened.
      <Box marginTop="16px">
        <Button type="button" look="outline" onClick={onDone}>
          Done
        </Button>
      </Box>
    </Box>
  );
}
