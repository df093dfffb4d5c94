import { Box, Flex } from '@chakra-ui/react';
import type { TryOutResponse } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { TextField } from '../../../components/TextField';
import { useKeeping } from '../../../lib/useKeeping';
import { useTryOutActions } from '../hooks/useTryOutActions';
import { WinnerSetup } from './WinnerSetup';

interface WinnerFormProps {
  tryOut: TryOutResponse;
  winnerId: string;
  winnerName: string;
}

/** Why the chosen one wins, and making it how things stand from now on. */
export function WinnerForm({ tryOut, winnerId, winnerName }: WinnerFormProps) {
  const { update, makeSetup, undoSetup } = useTryOutActions();
  const [written, setWritten] = useState<string | null>(null);
  const { busy, failure, keep } = useKeeping();
  const reason = written ?? tryOut.reason;
  const made = tryOut.winnerPlaceId === winnerId ? tryOut.winnerSetup : null;
  const isTold = tryOut.reason === reason.trim();
  const keepWinner = () =>
    keep(async () => {
      if (made) await update(tryOut.id, { reason });
      else await makeSetup(tryOut.id, { winnerPlaceId: winnerId, reason });
      setWritten(null);
    });
  return (
    <Box
      as="form"
      marginTop="24px"
      onSubmit={(event) => {
        event.preventDefault();
        void keepWinner();
      }}
    >
      <Flex wrap="wrap" alignItems="flex-end" columnGap="18px" rowGap="14px">
        <Box flex="1 1 300px">
          <TextField
            label={`Why ${winnerName} wins, in your words`}
            value={reason}
            onChange={setWritten}
            maxLength={1000}
          />
        </Box>
        {(!made || !isTold) && (
          <Button type="submit" aria-disabled={busy}>
            {busy ? 'Keeping…' : made ? 'Keep the reason' : `Make ${winnerName} the setup`}
          </Button>
        )}
      </Flex>
      <WinnerSetup {...{ made, winnerName, busy }} onUndo={() => void keep(() => undoSetup(tryOut.id))} />
      {failure && <FieldError>{failure}</FieldError>}
    </Box>
  );
}
