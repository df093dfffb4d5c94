import { Box } from '@chakra-ui/react';
import { SheetPaper } from './SheetPaper';

/** Stands where a page will be, the size of a page, so that nothing jumps. */
export function PageLoading() {
  return (
    <SheetPaper>
      <Box minHeight="70vh" role="status" aria-label="Loading" />
    </SheetPaper>
  );
}
