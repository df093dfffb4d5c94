import { Box } from '@chakra-ui/react';
import { CheckBox } from '../../../components/CheckBox';
import { KeysList } from '../../sheet/components/KeysList';
import { useKept } from '../hooks/useKept';
import { NotKept } from './Kept';
import { SettingsSection } from './SettingsSection';

/** Single keys on or off, and what each does. */
export function KeysSection({ singleKeys }: { singleKeys: boolean }) {
  const { keep, kept, failure } = useKept();
  return (
    <SettingsSection title="Keys" kept={kept}>
      <Box marginTop="6px">
        <CheckBox checked={singleKeys} onChange={(on) => void keep({ settings: { singleKeys: on } })}>
          Single keys work on a sheet
        </CheckBox>
      </Box>
      <NotKept failure={failure} />
      <Box fontSize="16px" color={singleKeys ? 'ink' : 'ink.muted'}>
        <KeysList />
      </Box>
    </SettingsSection>
  );
}
