import { Box, Flex } from '@chakra-ui/react';
import type { ListTakesResponse, Target } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { StatusMark } from '../../../components/StatusMark';
import { targetCount } from '../targetCount';

/** "With this, **17 of your 20 takes** are on target." It recounts while a grip is dragged. */
export function CountSentence({
  page,
  error,
  onRetry,
  target,
}: {
  page: ListTakesResponse | undefined;
  error: Error | undefined;
  onRetry: () => void;
  target: Target;
}) {
  return (
    <Flex
      alignItems="flex-start"
      gap="12px"
      minHeight="26px"
      marginTop="9px"
      fontSize="16px"
      lineHeight="24px"
    >
      {page && <Counted page={page} target={target} />}
      {!page && error && (
        <Box role="alert">
          Your takes could not be counted. {error.message}{' '}
          <TextButton onClick={onRetry}>Try again</TextButton>
        </Box>
      )}
      {!page && !error && <Box color="ink.muted">Counting your takes…</Box>}
    </Flex>
  );
}

function Counted({ page, target }: { page: ListTakesResponse; target: Target }) {
  const { counted, onTarget, strong, rest } = targetCount(page.items, target, page.everyTotal);
  if (counted === 0) return <Box color="ink.muted">Your takes will be counted here.</Box>;
  return (
    <>
      <StatusMark status={onTarget * 2 >= counted ? 'good' : 'watch'} sizePx={20} />
      <Box aria-live="polite">
        With this, <b>{strong}</b> {rest}
      </Box>
    </>
  );
}
