import { Box } from '@chakra-ui/react';
import { ButtonLink } from '../../../components/ButtonLink';

/** On a phone the way to Big print stands beside the other buttons; a wider screen has it in the margin. */
export function BigPrintButton({ takeId }: { takeId: string }) {
  return (
    <Box display={{ base: 'block', lg: 'none' }}>
      <ButtonLink to={`/takes/${takeId}/big`} look="outline">
        Big print
      </ButtonLink>
    </Box>
  );
}
