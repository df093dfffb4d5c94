import { Box } from '@chakra-ui/react';
import { updateMeRequest, type MeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { TextField } from '../../../components/TextField';
import { useKept } from '../hooks/useKept';
import { EmailShown, NewEmail } from './EmailPart';
import { Kept } from './Kept';
import { NewPassword } from './NewPassword';
import { SettingsSection } from './SettingsSection';

/** Name, address and password. */
export function YouSection({ me }: { me: MeResponse }) {
  const [open, setOpen] = useState<'password' | 'email' | null>(null);
  const close = () => setOpen(null);
  return (
    <SettingsSection title="You">
      <Box
        display="grid"
        gridTemplateColumns={{ base: '1fr', sm: 'minmax(0, 192px) minmax(0, 1fr)' }}
        columnGap="24px"
        rowGap="12px"
      >
        <NameField name={me.name} />
        <EmailShown me={me} onChange={() => setOpen('email')} />
      </Box>
      <Box marginTop={{ base: '12px', sm: open ? '16px' : '-24px' }}>
        {open === 'email' && <NewEmail onDone={close} />}
        {open === 'password' && <NewPassword onDone={close} />}
        {!open && (
          <TextButton minHeight="32px" onClick={() => setOpen('password')}>
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
