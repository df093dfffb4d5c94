import { Box } from '@chakra-ui/react';
import type { RoomChangeResponse } from '@thudline/contracts';
import { PhotoField } from '../../../components/PhotoField';
import { useRoomActions } from '../hooks/useRoomActions';

/** How a change looked. */
export function ChangePhoto({
  roomId,
  change,
  canChange,
}: {
  roomId: string;
  change: RoomChangeResponse;
  canChange: boolean;
}) {
  const { addChangePhoto, removeChangePhoto } = useRoomActions();
  if (!change.photo && !canChange) return null;
  return (
    <Box marginTop="8px">
      <PhotoField
        photo={change.photo}
        alt={`Change ${change.number}: ${change.what}`}
        label={`photo of change ${change.number}`}
        canChange={canChange}
        onAdd={(file, signal) => addChangePhoto(roomId, change.id, file, signal)}
        onRemove={() => removeChangePhoto(roomId, change.id)}
      />
    </Box>
  );
}
