import { Box, chakra } from '@chakra-ui/react';
import { shareLimits } from '@thudline/contracts';
import { useState, type FormEvent } from 'react';
import { Button } from '../../../components/Button';
import { Headline } from '../../../components/Headline';
import { PasswordField } from '../../../components/PasswordField';
import { SheetPaper } from '../../../components/SheetPaper';
import { ApiError } from '../../../lib/apiClient';

/** Before anything is told of what a link opens. */
export function AskPassphrase({ openWith }: { openWith: (passphrase: string) => Promise<void> }) {
  const [passphrase, setPassphrase] = useState('');
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState('');
  const open = async () => {
    setBusy(true);
    setFailure('');
    try {
      await openWith(passphrase);
    } catch (error) {
      setFailure(error instanceof ApiError ? error.message : 'That did not work. Try again.');
      setBusy(false);
    }
  };
  const send = (event: FormEvent) => {
    event.preventDefault();
    if (passphrase.trim()) void open();
    else setFailure('Write the passphrase first.');
  };
  return (
    <SheetPaper>
      <Box paddingTop={{ base: '24px', lg: '40px' }} maxWidth="520px">
        <Headline>
          <b>This link asks for a passphrase.</b> Whoever sent it knows it.
        </Headline>
        <chakra.form onSubmit={send} marginTop="24px" noValidate>
          <PasswordField
            label="Passphrase"
            value={passphrase}
            onChange={setPassphrase}
            maxLength={shareLimits.passphrase.longest}
            autoComplete="off"
            error={failure}
          />
          <Button type="submit" marginTop="20px" disabled={busy}>
            {busy ? 'Opening…' : 'Open it'}
          </Button>
        </chakra.form>
      </Box>
    </SheetPaper>
  );
}
