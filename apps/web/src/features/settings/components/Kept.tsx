import { Box, chakra } from '@chakra-ui/react';
import { FieldError } from '../../../components/FieldError';

/** The quiet word that a change is on the server. Its place is always there, so that nothing jumps. */
export function Kept({ kept }: { kept: boolean }) {
  return (
    <chakra.span role="status" fontSize="caption" color="ink.muted" whiteSpace="nowrap">
      {kept && 'kept'}
    </chakra.span>
  );
}

/** Why a change could not be kept, beside its field. */
export function NotKept({ failure }: { failure: string }) {
  if (!failure) return null;
  return (
    <Box fontSize="small">
      <FieldError>
        <b>Not kept.</b> {failure}
      </FieldError>
    </Box>
  );
}
