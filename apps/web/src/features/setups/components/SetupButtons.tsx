import { Box, Flex } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Button } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';

/** Keeping what is written, what else can be done, and what stands in the way. */
export function SetupButtons({
  busy,
  failure,
  state,
  onKeep,
  children,
  note,
}: {
  busy: boolean;
  failure: string;
  /** "kept", "not kept yet". */
  state: string;
  onKeep: () => void;
  children?: ReactNode;
  /** What to know before it is changed. */
  note?: ReactNode;
}) {
  return (
    <Box marginTop="30px" _print={{ display: 'none' }}>
      {note && (
        <Box fontSize="small" color="ink.muted" marginBottom="10px">
          {note}
        </Box>
      )}
      {failure && <FieldError>{failure}</FieldError>}
      <Flex gap="14px" alignItems="center" wrap="wrap" marginTop="6px">
        <Button type="button" aria-disabled={busy} onClick={onKeep}>
          {busy ? 'Keeping…' : 'Keep this setup'}
        </Button>
        {children}
        <Box role="status" fontSize="small" color="ink.muted">
          {state}
        </Box>
      </Flex>
    </Box>
  );
}
