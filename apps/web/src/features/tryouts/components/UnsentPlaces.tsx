import { Box, Flex } from '@chakra-ui/react';
import type { TryOutResponse } from '@thudline/contracts';
import { Button, TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { ProgressSwell } from '../../../components/ProgressSwell';
import { plural } from '../../../lib/format';
import { useSendQueue } from '../hooks/useSendQueue';
import { useTryOutActions } from '../hooks/useTryOutActions';
import type { Sending } from '../upload/sendQueue';
import { sendingWords } from '../upload/sendingWords';
import { unsentPlaces } from '../upload/unsentPairs';
import { UnsentDrop } from './UnsentDrop';

/** Pairs on their way, or which never arrived: told honestly, and how to bring them. */
export function UnsentPlaces({ tryOut, mayChange }: { tryOut: TryOutResponse; mayChange: boolean }) {
  const { sending, again } = useSendQueue(tryOut.id);
  const { removePlace } = useTryOutActions();
  const unsent = unsentPlaces(tryOut);
  const isOver = sending === null || sendingWords(sending).isOver;
  const failed = sending ? sendingWords(sending).failed : [];
  if (!isOver) return <OnTheirWay sending={sending} />;
  if (failed.length > 0)
    return (
      <Box marginTop="18px">
        {failed.map(({ name, message }) => (
          <FieldError key={name}>
            <b>{name}</b> did not arrive. {message}
          </FieldError>
        ))}
        <Button type="button" look="outline" marginTop="14px" onClick={again}>
          Send {failed.length === 1 ? 'it' : 'them'} again
        </Button>
      </Box>
    );
  // Sent a moment ago: the try-out is being read again.
  if (unsent.length === 0 || sending) return null;
  if (!mayChange) return <Box marginTop="18px">{plural(unsent.length, 'pair')} not sent yet.</Box>;
  const leaveOut = async () => {
    for (const { id } of unsent) await removePlace(tryOut.id, id);
  };
  return (
    <Box marginTop="18px" paddingY="12px" borderY="1px solid" borderColor="rule">
      <Box role="status">
        <b style={{ fontWeight: 600 }}>
          {plural(unsent.length, 'pair')} {unsent.length === 1 ? 'wasn’t' : 'weren’t'} sent yet:
        </b>{' '}
        drop {unsent.length === 1 ? 'its files' : 'their files'} again. Nothing is kept twice.
      </Box>
      <Box marginTop="6px" fontSize="caption" lineHeight="20px" color="ink.muted" overflowWrap="anywhere">
        {unsent.map(({ fileNames }) => fileNames.join(' and ')).join(', ')}
      </Box>
      <Flex wrap="wrap" alignItems="center" columnGap="18px" rowGap="8px" marginTop="10px">
        <UnsentDrop tryOut={tryOut} />
        <TextButton type="button" minHeight="44px" onClick={() => void leaveOut()}>
          leave {unsent.length === 1 ? 'it' : 'them'} out
        </TextButton>
      </Flex>
    </Box>
  );
}

function OnTheirWay({ sending }: { sending: Sending }) {
  const { takes, bytes, left, share } = sendingWords(sending);
  return (
    <Box marginTop="18px" maxWidth="420px">
      <ProgressSwell share={share} label="Sending the takes" valueText={`${takes}, ${bytes}`} />
      <Flex justifyContent="space-between" columnGap="16px" marginTop="6px" fontSize="caption" wrap="wrap">
        <Box color="ink.muted">
          {takes}, {bytes}
        </Box>
        <Box fontWeight={600}>{left}</Box>
      </Flex>
      <Box fontSize="caption" color="ink.muted">
        Leave this tab open until they are there; other pages can be read meanwhile.
      </Box>
    </Box>
  );
}
