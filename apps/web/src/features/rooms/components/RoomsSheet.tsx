import { Box, Flex, chakra } from '@chakra-ui/react';
import { defaultUserSettings, type CreateRoomRequest } from '@thudline/contracts';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { Headline } from '../../../components/Headline';
import { useMe } from '../../auth/hooks/useMe';
import { useRoomActions } from '../hooks/useRoomActions';
import { useRooms } from '../hooks/useRooms';
import { RoomForm } from './RoomForm';
import { RoomsTable } from './RoomsTable';

/** All the player's rooms. */
export function RoomsSheet() {
  const { me } = useMe();
  const settings = me?.settings ?? defaultUserSettings;
  const { rooms, error, retry } = useRooms();
  const { create } = useRoomActions();
  const navigate = useNavigate();
  const [adding, setAdding] = useState(false);
  const save = async (request: CreateRoomRequest) => {
    const room = await create(request);
    await navigate(`/rooms/${room.id}`);
  };
  const add = !me?.readOnly && <Button onClick={() => setAdding(true)}>Add a room</Button>;
  return (
    <>
      {rooms?.length === 0 ? (
        <>
          <Headline marginTop={{ base: '8px', lg: '17px' }} maxWidth="704px">
            <b>Your first room needs a name.</b> Then its log keeps what you changed, and the takes show what
            each change did.
          </Headline>
          <Box marginTop="24px">{add}</Box>
        </>
      ) : (
        <Flex alignItems="center" minHeight="44px">
          <chakra.h1 fontSize="28px" lineHeight="34px" fontWeight={900} flex="1">
            Rooms
          </chakra.h1>
          {rooms && add}
        </Flex>
      )}
      {error && (
        <Box marginTop="24px">
          <FieldError>
            <b>The rooms could not be read.</b> {error.message}
          </FieldError>
          <Button marginTop="18px" onClick={retry}>
            Try again
          </Button>
        </Box>
      )}
      {!rooms && !error && <Box role="status" aria-label="Loading the rooms" height="220px" />}
      {rooms && rooms.length > 0 && <RoomsTable rooms={rooms} lengthUnit={settings.lengthUnit} />}
      {adding && (
        <RoomForm title="A room" settings={settings} onSave={save} onClose={() => setAdding(false)} />
      )}
    </>
  );
}
