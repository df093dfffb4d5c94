import { Box } from '@chakra-ui/react';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { PageLoading } from '../components/PageLoading';
import { PageMessage } from '../components/PageMessage';
import { SheetPaper } from '../components/SheetPaper';
import { Progress } from '../features/progress/components/Progress';
import { useProgress } from '../features/progress/hooks/useProgress';
import { plural } from '../lib/format';
import { usePageTitle } from '../lib/usePageTitle';

/** The player's own progress. */
export function ProgressPage() {
  const { takes, error, retry } = useProgress();
  usePageTitle('Progress');
  if (error)
    return (
      <PageMessage strong="Your progress could not be read." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  if (!takes) return <PageLoading />;
  if (takes.length === 0)
    return (
      <PageMessage
        strong="No take is measured yet."
        rest="From the second one on, this shows how even you play, how loud your cymbals are and how much headroom is left."
      >
        <ButtonLink to="/takes/new">Add a take</ButtonLink>
      </PageMessage>
    );
  return (
    <SheetPaper>
      <Box color="ink.muted" fontSize="small" lineHeight="22px">
        Your progress · {plural(takes.length, 'measured take')}
      </Box>
      <Progress takes={takes} openTakes />
    </SheetPaper>
  );
}
