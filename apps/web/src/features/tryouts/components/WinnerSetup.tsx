import { Box } from '@chakra-ui/react';
import type { TryOutResponse } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { TextLink } from '../../../components/TextLink';

/** What the winner was made to, or what would become of it. */
export function WinnerSetup({
  made,
  winnerName,
  busy,
  onUndo,
}: {
  made: TryOutResponse['winnerSetup'];
  winnerName: string;
  busy: boolean;
  onUndo: () => void;
}) {
  return (
    <Box marginTop="10px" minHeight="42px" fontSize="small" lineHeight="21px">
      <Box role="status">
        {made && (
          <>
            <b style={{ fontWeight: 600 }}>
              {made.isCurrent ? `${winnerName} is the setup now.` : `${winnerName} was made a setup.`}
            </b>{' '}
            It is called <TextLink to={`/setups/${made.id}`}>{made.name}</TextLink>
            {made.copiedFrom && `, a copy of “${made.copiedFrom.name}”`}.{' '}
            {made.isCurrent ? 'Your next upload begins with it.' : 'Another one stands since.'}
          </>
        )}
      </Box>
      {made ? (
        <TextButton type="button" minHeight="32px" aria-disabled={busy} onClick={onUndo}>
          Undo
        </TextButton>
      ) : (
        <Box color="ink.muted">
          Copies the setup it was recorded with, puts {winnerName} into it, and your next upload begins with
          it.
        </Box>
      )}
    </Box>
  );
}
