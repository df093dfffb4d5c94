import { Box, Flex } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import type { NewTake } from '../hooks/useNewTake';

/** Measure, stop, or send again; with what stands in the way. */
export function SendRow({ newTake }: { newTake: NewTake }) {
  const { sending } = newTake.state;
  const problem = newTake.notYet || (sending.phase === 'refused' ? sending.message : '');
  const again = sending.phase === 'lost' || sending.phase === 'stopped' || sending.phase === 'refused';
  return (
    <>
      {problem && <FieldError>{problem}</FieldError>}
      <Flex marginTop="18px" columnGap="14px" rowGap="12px" alignItems="center" wrap="wrap">
        {sending.phase === 'sending' ? (
          <Button type="button" look="outline" onClick={newTake.stop}>
            {newTake.arranged.used.length === 1 ? 'Stop' : 'Stop both'}
          </Button>
        ) : (
          <Button
            type="button"
            aria-disabled={sending.phase === 'arrived'}
            onClick={() => void newTake.upload()}
          >
            {again ? 'Send it again' : 'Measure this take'}
          </Button>
        )}
        <Box marginLeft={{ base: 0, lg: 'auto' }} fontSize="small" color="ink.muted">
          {sending.phase === 'sending'
            ? 'Stay on this page until the files are there.'
            : 'You can leave this page after sending; the sheet waits under Takes.'}
        </Box>
      </Flex>
    </>
  );
}
