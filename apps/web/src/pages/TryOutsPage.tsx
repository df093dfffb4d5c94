import { Box } from '@chakra-ui/react';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { Headline } from '../components/Headline';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { PageTitle } from '../components/PageTitle';
import { SheetPaper } from '../components/SheetPaper';
import { useMe } from '../features/auth/hooks/useMe';
import { DeletedTryOut } from '../features/tryouts/components/DeletedTryOut';
import { TryOutsList } from '../features/tryouts/components/TryOutsList';
import { useTryOuts } from '../features/tryouts/hooks/useTryOuts';

/** The player's try-outs, newest first. */
export function TryOutsPage() {
  const { me } = useMe();
  const { tryOuts, error, retry } = useTryOuts();
  if (error)
    return (
      <PageMessage strong="The try-outs could not be read." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  if (!tryOuts || !me) return <PageLoading />;
  return (
    <SheetPaper>
      <PageTitle>Try-outs</PageTitle>
      <Headline marginTop="5px">
        {tryOuts.length === 0 ? (
          <>
            <b>A few centimetres can matter.</b> Play the same groove at several positions, and see which is
            best.
          </>
        ) : (
          <b>Try-outs</b>
        )}
      </Headline>
      {tryOuts.length > 0 && <TryOutsList items={tryOuts} lengthUnit={me.settings.lengthUnit} />}
      {!me.readOnly && (
        <Box marginTop="22px">
          <ButtonLink to="/tryouts/new">Start a try-out</ButtonLink>
        </Box>
      )}
      <DeletedTryOut />
    </SheetPaper>
  );
}
