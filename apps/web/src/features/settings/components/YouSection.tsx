import { Box } from '@chakra-ui/react';
import { updateMeRequest, type MeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { FieldLabel, TextField } from '../../../components/TextField';
import { useKept } from '../hooks/useKept';
import { Kept } from './Kept';
import { NewPassword } from './NewPassword';
import { SettingsSection } from './SettingsSection';
import { VerifiedWords } from './VerifiedWords';

/** Name, address and password. */
export function YouSection({ me }: { me: MeResponse }) {
  const [settingPassword, setSettingPassword] = useState(false);
  return (
    <SettingsSection title="You">
      <Box
        display="grid"
        gridTemplateColumns={{ base: '1fr', sm: 'minmax(0, 192px) minmax(0, 1fr)' }}
        columnGap="24px"
        rowGap="12px"
      >
        <NameField name={me.name} />
        <Email me={me} />
      </Box>
      <Box marginTop={{ base: '12px', sm: settingPassword ? '16px' : '-24px' }}>
        {settingPassword ? (
          <NewPassword onDone={() => setSettingPassword(false)} />
        ) : (
          <TextButton minHeight="32px" onClick={() => setSettingPassword(true)}>
            Set a new password
          </TextButton>
        )}
      </Box>
    </SettingsSection>
  );
}

/** Kept when it is left; what the contract refuses stays in the field with the reason. */
function NameField({ name }: { name: string }) {
  const { keep, kept, failure } = useKept();
  const [typed, setTyped] = useState<string | null>(null);
  const [refusal, setRefusal] = useState('');
  const leave = () => {
    if (typed === null || typed.trim() === name) return setTyped(null);
    const parsed = updateMeRequest.shape.name.safeParse(typed);
    if (!parsed.success) return setRefusal(parsed.error.issues[0]?.message ?? 'This is no name.');
    setTyped(null);
    void keep({ name: parsed.data });
  };
  return (
    <TextField
      label="Name"
      autoComplete="name"
      value={typed ?? name}
      onChange={(text) => {
        setTyped(text);
        setRefusal('');
      }}
      onBlur={leave}
      onKeyDown={(event) => event.key === 'Enter' && leave()}
      error={refusal || (failure && `Not kept. ${failure}`)}
      end={<Kept kept={kept && typed === null} />}
    />
  );
}

function Email({ me }: { me: MeResponse }) {
  return (
    <Box minWidth={0}>
      <FieldLabel as="div">E-mail</FieldLabel>
      <Box
        display="flex"
        alignItems="center"
        minHeight="46px"
        paddingX="3px"
        borderBottom="2px solid"
        borderColor="rule"
        fontWeight={600}
        overflowWrap="anywhere"
      >
        {me.email}
      </Box>
      <VerifiedWords verified={me.emailVerified} />
    </Box>
  );
}
