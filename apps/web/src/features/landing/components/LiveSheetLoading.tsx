import { Box } from '@chakra-ui/react';

/** Holds the place of the live sheet, so that what stands below it does not jump. */
export function LiveSheetLoading() {
  return <Box minHeight={{ base: '1060px', lg: '700px' }} role="status" aria-label="Loading a sheet" />;
}
