import { Box } from '@chakra-ui/react';

/** Holds the place of the pictures under "Adding up". */
export function BenchLoading() {
  return <Box height={{ base: '860px', lg: '760px' }} role="status" aria-label="Loading the pictures" />;
}
