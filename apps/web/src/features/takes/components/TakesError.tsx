import { Box } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';

/** The list could not be read; the takes themselves are safe. */
export function TakesError({ message, onRetry }: { message: string; onRetry: () => void }) {
  return (
    <Box marginTop="24px" paddingTop="16px" borderTop="1px solid" borderColor="rule">
      <FieldError>
        <b>The list could not be read.</b> {message}
      </FieldError>
      <Button marginTop="18px" onClick={onRetry}>
        Try again
      </Button>
    </Box>
  );
}
