import { Box } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';

/** The button of a form. It keeps the focus while an answer is awaited, and says so. */
export function SubmitRow({
  label,
  busyLabel,
  busy,
  error,
}: {
  label: string;
  busyLabel: string;
  busy: boolean;
  error: string;
}) {
  return (
    <Box>
      {error && (
        <Box marginBottom="18px">
          <FieldError>{error}</FieldError>
        </Box>
      )}
      <Button type="submit" aria-disabled={busy} minWidth="121px" paddingX="14px" opacity={busy ? 0.7 : 1}>
        {busy ? busyLabel : label}
      </Button>
    </Box>
  );
}
