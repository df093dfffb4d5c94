import { Box, Flex } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';

/** The button of a form. It keeps the focus while an answer is awaited, and says so. */
export function SubmitRow({
  label,
  busyLabel,
  busy,
  error,
  children,
}: {
  label: string;
  busyLabel: string;
  busy: boolean;
  error: string;
  /** Stands beside the button. */
  children?: ReactNode;
}) {
  return (
    <Box>
      {error && (
        <Box marginBottom="18px">
          <FieldError>{error}</FieldError>
        </Box>
      )}
      <Flex wrap="wrap" alignItems="center" columnGap="15px" rowGap="10px">
        <Button type="submit" aria-disabled={busy} minWidth="121px" paddingX="14px" opacity={busy ? 0.7 : 1}>
          {busy ? busyLabel : label}
        </Button>
        {children}
      </Flex>
    </Box>
  );
}
