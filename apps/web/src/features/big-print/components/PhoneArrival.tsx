import { Box } from '@chakra-ui/react';
import { Navigate } from 'react-router-dom';
import { Headline } from '../../../components/Headline';
import { PageLoading } from '../../../components/PageLoading';
import { CheckTake } from '../../first-run/components/CheckTake';
import { useNewestTake } from '../hooks/useNewestTake';
import { useWakeLock } from '../hooks/useWakeLock';
import { BigPaper } from './BigPaper';

/** A phone that was let in: on to the newest take, or to what to play first. */
export function PhoneArrival() {
  const { newest } = useNewestTake();
  useWakeLock();
  if (newest) return <Navigate to={`/takes/${newest.id}/big`} replace />;
  if (newest === undefined) return <PageLoading />;
  return (
    <BigPaper
      foot={
        <Box fontSize="small" color="ink.muted">
          Your first take appears here by itself.
        </Box>
      }
    >
      <Headline marginTop="8px" marginBottom="18px">
        <b>The check take.</b> 45 seconds of playing.
      </Headline>
      <CheckTake />
    </BigPaper>
  );
}
