import { Box, Flex } from '@chakra-ui/react';
import type { TryOutResponse } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { TextField } from '../../../components/TextField';
import { useTryOutActions } from '../hooks/useTryOutActions';

/** Why the chosen one wins, and keeping it as how things stand from now on. */
export function WinnerForm({
  tryOut,
  winnerId,
  winnerName,
}: {
  tryOut: TryOutResponse;
  winnerId: string;
  winnerName: string;
}) {
  const { update } = useTryOutActions();
  const [written, setWritten] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState('');
  const reason = written ?? tryOut.reason;
  const isKept = tryOut.winnerPlaceId === winnerId && tryOut.reason === reason.trim();
  const keep = async () => {
    setBusy(true);
    setFailure('');
    try {
      await update(tryOut.id, { winnerPlaceId: winnerId, reason });
      setWritten(null);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'That did not work. Try again.');
    } finally {
      setBusy(false);
    }
  };
  return (
    <Box
      as="form"
      marginTop="24px"
      onSubmit={(event) => {
        event.preventDefault();
        if (!busy) void keep();
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
        <Button type="submit" aria-disabled={busy}>
          {busy ? 'Keeping…' : `Keep ${winnerName} as the winner`}
        </Button>
      </Flex>
      <Box role="status" marginTop="8px" minHeight="20px" fontSize="caption" color="ink.muted">
        {isKept && `${winnerName} is kept as the winner.`}
      </Box>
      {failure && <FieldError>{failure}</FieldError>}
    </Box>
  );
}
