import { Box } from '@chakra-ui/react';
import { TextButton } from '../../../components/Button';
import { SheetSection } from '../../sheet/components/SheetSection';

/** The sheet stands; only what people wrote on it is missing. */
export function NotesError({ error, retry }: { error: Error; retry: () => void }) {
  return (
    <SheetSection id="notes" title="Notes">
      <Box role="alert" marginTop="4px">
        The notes could not be loaded. {error.message}{' '}
        <TextButton fontWeight={600} onClick={retry}>
          Try again
        </TextButton>
      </Box>
    </SheetSection>
  );
}
