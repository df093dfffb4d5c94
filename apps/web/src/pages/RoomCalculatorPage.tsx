import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { useMe } from '../features/auth/hooks/useMe';
import { CalculatorSheet } from '../features/calculator/components/CalculatorSheet';
import { MissingMeasures } from '../features/calculator/components/MissingMeasures';
import { knownRoom } from '../features/calculator/knownRoom';
import { useOneRoom } from '../features/rooms/hooks/useOneRoom';
import { ApiError } from '../lib/apiClient';
import { usePageTitle } from '../lib/usePageTitle';

/** What a treatment would do to one room. */
export function RoomCalculatorPage() {
  const { roomId = '' } = useParams();
  const { me } = useMe();
  const { room, error, retry } = useOneRoom(roomId);
  usePageTitle(room ? `${room.name}, calculator` : 'Room calculator');
  const usualC = me?.settings.temperatureC;
  const known = useMemo(
    () => (room && usualC !== undefined ? knownRoom(room, usualC) : null),
    [room, usualC],
  );
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
  if (!room || !me || !known) return <PageLoading />;
  const shared = { room, settings: me.settings, readOnly: me.readOnly };
  if ('missing' in known) return <MissingMeasures {...shared} missing={known.missing} />;
  return <CalculatorSheet {...shared} known={known.known} />;
}
