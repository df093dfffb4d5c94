import { Box } from '@chakra-ui/react';
import { Dialog } from '../../../components/Dialog';
import { KeysList, type KeyWords } from './KeysList';

/** "?": what the keys of this page do. */
export function KeysDialog({ keys, onClose }: { keys?: KeyWords; onClose: () => void }) {
  return (
    <Dialog title="Keys" onClose={onClose}>
      <KeysList keys={keys} />
      <Box fontSize="small" color="ink.muted" marginTop="14px">
        Single keys can be switched off in the settings.
      </Box>
    </Dialog>
  );
}
