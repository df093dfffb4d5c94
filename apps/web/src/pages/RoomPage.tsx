import { Box } from '@chakra-ui/react';
import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { useMe } from '../features/auth/hooks/useMe';
import { RoomLog } from '../features/rooms/components/RoomLog';
import { useRoom } from '../features/rooms/hooks/useRoom';
import { SendThis } from '../features/shares/components/SendThis';
import { ApiError } from '../lib/apiClient';
import { usePageTitle } from '../lib/usePageTitle';

/** One room and its log. */
export function RoomPage() {
  const { roomId = '' } = useParams();
  const { me } = useMe();
  const { room, changes, takes, error, retry } = useRoom(roomId);
  usePageTitle(room?.name ?? 'Room');
  if (error instanceof ApiError && error.code === 'not-found')
    return (
      <PageMessage
        strong="There is no such room here."
        rest="It may have been removed, or it is somebody else’s."
      >
        <ButtonLink to="/rooms">Go to your rooms</ButtonLink>
      </PageMessage>
    );
  if (error)
    return (
      <PageMessage strong="The room could not be opened." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  if (!room || !changes || !me) return <PageLoading />;
  return (
    <RoomLog
      key={room.id}
      {...{ room, changes, takes }}
      settings={me.settings}
      readOnly={me.readOnly}
      marginHead={
        !me.readOnly && (
          <Box marginBottom="22px">
            <SendThis subject={{ kind: 'room', roomId }} inset={false} />
          </Box>
        )
      }
    />
  );
}
