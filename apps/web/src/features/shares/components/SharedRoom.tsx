import { defaultUserSettings, type OpenedShareResponse } from '@thudline/contracts';
import { LinksAsText } from '../../../components/LinksAsText';
import { PageLoading } from '../../../components/PageLoading';
import { useMe } from '../../auth/hooks/useMe';
import { RoomLog } from '../../rooms/components/RoomLog';
import { useRoom } from '../../rooms/hooks/useRoom';
import { GuestFailure } from './GuestFailure';
import { GuestQuestion } from './GuestQuestion';

/** A room's log to read: its sheets, and with them its sound, were not sent. */
export function SharedRoom({ opened, roomId }: { opened: OpenedShareResponse; roomId: string }) {
  const { me } = useMe();
  const { room, changes, takes, error, retry } = useRoom(roomId);
  if (error) return <GuestFailure error={error} retry={retry} />;
  if (!room || !changes) return <PageLoading />;
  return (
    <LinksAsText>
      <RoomLog
        {...{ room, changes, takes }}
        settings={me?.settings ?? defaultUserSettings}
        above={<GuestQuestion opened={opened} />}
        canHear={false}
        readOnly
      />
    </LinksAsText>
  );
}
