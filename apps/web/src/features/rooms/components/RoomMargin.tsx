import { Box, chakra } from '@chakra-ui/react';
import { paths, type RoomChangeResponse, type RoomResponse, type UserSettings } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { TextLink } from '../../../components/TextLink';
import { DownloadLink } from '../../../components/DownloadLink';
import { PhotoField } from '../../../components/PhotoField';
import { useRoomActions } from '../hooks/useRoomActions';
import { RoomPlan } from '../pictures/RoomPlan';
import { roomMeasures } from '../roomWords';

const keptLink = {
  textDecoration: 'underline',
  textUnderlineOffset: '3px',
  display: 'inline-block',
  paddingBlock: '8px',
};

/** Beside the log: the plan, the room in a line, and the caution. */
export function RoomMargin({
  room,
  changes,
  lengthUnit,
  onEdit,
}: {
  room: RoomResponse;
  changes: readonly RoomChangeResponse[];
  lengthUnit: UserSettings['lengthUnit'];
  onEdit?: () => void;
}) {
  const { addPhoto, removePhoto } = useRoomActions();
  const measures = roomMeasures(room, lengthUnit);
  const hasPlan = room.shape.kind === 'box' && room.shape.lengthM !== null && room.shape.widthM !== null;
  return (
    <>
      <chakra.h2 fontSize="16px" fontWeight={600} lineHeight="22px" marginBottom="10px">
        {hasPlan ? `${room.name} from above` : room.name}
      </chakra.h2>
      <RoomPlan room={room} changes={changes} />
      {!hasPlan && (
        <Box color="ink.muted">Write down its length and width, and it is drawn here to scale.</Box>
      )}
      <Box fontSize="caption" color="ink.muted" lineHeight="20px" marginTop="8px">
        {measures}
        {room.kit && hasPlan && (
          <Box>
            <chakra.span color="kick" aria-hidden>
              ●
            </chakra.span>{' '}
            kick mic{' '}
            <chakra.span color="overhead" aria-hidden>
              ○
            </chakra.span>{' '}
            overhead · numbers: changes
          </Box>
        )}
      </Box>
      <TextLink
        to={`/rooms/${room.id}/calculator`}
        display="inline-block"
        fontSize="small"
        fontWeight={600}
        marginTop="8px"
        paddingY="8px"
        _print={{ display: 'none' }}
      >
        Estimate a change before you make it
      </TextLink>
      {onEdit && (
        <TextButton
          display="block"
          fontSize="small"
          marginTop="8px"
          paddingY="8px"
          onClick={onEdit}
          _print={{ display: 'none' }}
        >
          change what is written down
        </TextButton>
      )}
      <Box marginTop="8px">
        <PhotoField
          photo={room.photo}
          alt={room.name}
          label="photo of the room"
          canChange={onEdit !== undefined}
          onAdd={(file, signal) => addPhoto(room.id, file, signal)}
          onRemove={() => removePhoto(room.id)}
        />
      </Box>
      {onEdit && (
        <Box fontSize="small" marginTop="4px" _print={{ display: 'none' }} css={{ '& a': keptLink }}>
          <DownloadLink href={paths.roomFile(room.id)}>keep all of this room as a file</DownloadLink>
        </Box>
      )}
      <Box
        marginTop="14px"
        paddingTop="12px"
        borderTop="1px solid"
        borderColor="rule"
        fontSize="caption"
        lineHeight="19px"
        color="ink.muted"
      >
        Hanging something overhead or building a panel? Fix it so that it can’t fall, check that the material
        resists fire, and ask a qualified person about structure and wiring. Local codes come first.
      </Box>
    </>
  );
}
