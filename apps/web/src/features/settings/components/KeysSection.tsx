import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { CheckBox } from '../../../components/CheckBox';
import { KeysList } from '../../sheet/components/KeysList';
import { useKept } from '../hooks/useKept';
import { NotKept } from './Kept';
import { SettingsSection } from './SettingsSection';

/** Single keys on or off, and what each does. */
export function KeysSection({ singleKeys }: { singleKeys: boolean }) {
  const { keep, kept, failure } = useKept();
  const [seen, setSeen] = useState(false);
  return (
    <SettingsSection title="Keys" kept={kept}>
      <Box marginTop="6px">
        <CheckBox checked={singleKeys} onChange={(on) => void keep({ settings: { singleKeys: on } })}>
          Single keys: Space plays, 1 2 3 choose
        </CheckBox>
      </Box>
      <NotKept failure={failure} />
      {seen && (
        <Box id="every-key" fontSize="16px" color={singleKeys ? 'ink' : 'ink.muted'}>
          <KeysList />
        </Box>
      )}
      <TextButton
        fontSize="16px"
        minHeight="36px"
        aria-expanded={seen}
        aria-controls={seen ? 'every-key' : undefined}
        onClick={() => setSeen(!seen)}
      >
        {seen ? 'hide the keys' : 'see all keys'}
      </TextButton>
    </SettingsSection>
  );
}
