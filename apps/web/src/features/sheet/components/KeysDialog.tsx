import { Box } from '@chakra-ui/react';
import { Dialog } from '../../../components/Dialog';
import { KeysList } from './KeysList';

/** "?": what the keys of this page do. */
export function KeysDialog({ onClose }: { onClose: () => void }) {
  return (
    <Dialog title="Keys" onClose={onClose}>
      <KeysList />
      <Box fontSize="small" color="ink.muted" marginTop="14px">
        Single keys can be switched off in the settings.
      </Box>
    </Dialog>
  );
}
