import { Box, Flex } from '@chakra-ui/react';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { TextLink } from '../../../components/TextLink';
import { useRoomActions } from '../../rooms/hooks/useRoomActions';
import { plannedChange } from '../plannedChange';

interface PlanButtonsProps {
  roomId: string;
  /** What would stand in the log. */
  entry: { what: string; told: string; isSoft: boolean };
  readOnly: boolean;
  onAnother: () => void;
}

/** A plan goes into the log of its room, as what it is: a plan. */
export function PlanButtons({ roomId, entry, readOnly, onAnother }: PlanButtonsProps) {
  const { addChange } = useRoomActions();
  const [kept, setKept] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState('');
  const isKept = kept === entry.what;
  const keep = async () => {
    setBusy(true);
    setFailure('');
    try {
      await addChange(roomId, plannedChange(entry, new Date()));
      setKept(entry.what);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'That did not work. Try again.');
    }
    setBusy(false);
  };
  return (
    <Box marginTop="24px">
      <Flex gap="14px" wrap="wrap">
        {!readOnly && (
          <Button disabled={busy || isKept} onClick={() => void keep()}>
            Put this plan in the room log
          </Button>
        )}
        <Button look="outline" onClick={onAnother}>
          Try another
        </Button>
      </Flex>
      <Box aria-live="polite" marginTop={isKept ? '10px' : 0} fontSize="small">
        {isKept && (
          <>
            It stands in <TextLink to={`/rooms/${roomId}`}>the room log</TextLink>, marked as planned. When it
            is up, set its day there and add a take.
          </>
        )}
      </Box>
      {failure && <FieldError>{failure}</FieldError>}
    </Box>
  );
}
