import { defaultUserSettings, type OpenedShareResponse } from '@thudline/contracts';
import { useState } from 'react';
import { LinksAsText } from '../../../components/LinksAsText';
import { PageLoading } from '../../../components/PageLoading';
import { useMe } from '../../auth/hooks/useMe';
import { TryOutSheet } from '../../tryouts/components/TryOutSheet';
import { useTryOut } from '../../tryouts/hooks/useTryOut';
import { defaultRank, useTryOutRanking } from '../../tryouts/hooks/useTryOutRanking';
import { GuestFailure } from './GuestFailure';
import { GuestQuestion } from './GuestQuestion';

/** A try-out to read and hear: ranked by what the guest likes, and nothing is chosen. */
export function SharedTryOut({ opened, tryOutId }: { opened: OpenedShareResponse; tryOutId: string }) {
  const { me } = useMe();
  const [by, setBy] = useState(defaultRank);
  const { tryOut, error: tryOutError, retry: retryTryOut } = useTryOut(tryOutId);
  const { ranking, error: rankingError, retry: retryRanking } = useTryOutRanking(tryOut, by);
  const error = tryOutError ?? rankingError;
  if (error) return <GuestFailure error={error} retry={tryOutError ? retryTryOut : retryRanking} />;
  if (!tryOut || !ranking) return <PageLoading />;
  return (
    <LinksAsText>
      <TryOutSheet
        {...{ tryOut, ranking, by }}
        me={{ settings: me?.settings ?? defaultUserSettings, readOnly: true }}
        above={<GuestQuestion opened={opened} />}
        canListen={opened.canListen}
        onRankBy={setBy}
      />
    </LinksAsText>
  );
}
