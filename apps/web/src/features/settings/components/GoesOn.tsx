import { Box } from '@chakra-ui/react';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { dateTime } from '../../../lib/format';
import { useDeletion } from '../hooks/useDeletion';
import { useRefusal } from '../hooks/useRefusal';

/** "This account goes on 8 Dec." with the way to stop it. */
export function GoesOn({ deleteAfter }: { deleteAfter: string }) {
  const { stop } = useDeletion();
  const { refusal, act } = useRefusal(() => Promise.resolve());
  return (
    <Box role="status">
      <b>This account goes on {dateTime(deleteAfter)}.</b> Until then everything stays as it is.{' '}
      <TextButton fontWeight={600} minHeight="26px" onClick={() => void act(stop)}>
        Keep the account
      </TextButton>
      {refusal && <FieldError>{refusal}</FieldError>}
    </Box>
  );
}
