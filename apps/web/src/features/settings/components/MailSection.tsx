import { Box } from '@chakra-ui/react';
import { mailChoices, mailSettings, type MailChoice, type UserSettings } from '@thudline/contracts';
import { CheckBox } from '../../../components/CheckBox';
import { useKept } from '../hooks/useKept';
import { NotKept } from './Kept';
import { SettingsSection } from './SettingsSection';

const words: Record<MailChoice, string> = {
  notes: 'somebody answers or leaves a note',
  sent: 'somebody sends me a sheet',
  opened: 'a sheet I sent is opened for the first time',
  digest: 'a week has gone by: what changed, in one mail',
};

/** About what mails are wanted. */
export function MailSection({ settings }: { settings: UserSettings }) {
  const { keep, kept, failure } = useKept();
  return (
    <SettingsSection title="Mail me when" kept={kept}>
      {mailChoices.map((choice) => {
        const setting = mailSettings[choice];
        return (
          <Box key={choice} fontSize="16px" paddingY="7px">
            <CheckBox
              checked={settings[setting]}
              onChange={(wanted) => void keep({ settings: { [setting]: wanted } })}
            >
              {words[choice]}
            </CheckBox>
          </Box>
        );
      })}
      <NotKept failure={failure} />
    </SettingsSection>
  );
}
