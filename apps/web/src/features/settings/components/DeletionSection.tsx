import { Box, Flex, chakra } from '@chakra-ui/react';
import { deleteAccountRequest } from '@thudline/contracts';
import { useState } from 'react';
import { Button, TextButton } from '../../../components/Button';
import { Dialog } from '../../../components/Dialog';
import { PasswordField } from '../../../components/PasswordField';
import { AuthForm } from '../../auth/components/AuthForm';
import { SubmitRow } from '../../auth/components/SubmitRow';
import { useAuthForm } from '../../auth/hooks/useAuthForm';
import { useDeletion } from '../hooks/useDeletion';
import { GoesOn } from './GoesOn';

/** The way out: asked for with the password, and a week to think it over. */
export function DeletionSection({ deleteAfter }: { deleteAfter: string | null }) {
  const [asking, setAsking] = useState(false);
  return (
    <chakra.section
      aria-label="Delete the account"
      borderTop="1px solid"
      borderColor="rule"
      paddingTop="16px"
    >
      {deleteAfter ? (
        <GoesOn deleteAfter={deleteAfter} />
      ) : (
        <Flex gap="14px" alignItems="center" minHeight="48px" wrap={{ base: 'wrap', sm: 'nowrap' }}>
          <Button look="outline" flexShrink={0} color="fix" borderColor="fix" onClick={() => setAsking(true)}>
            Delete the account
          </Button>
          <Box fontSize="small" lineHeight="20px" color="ink.muted">
            You have 7 days to change your mind. Then nothing is left.
          </Box>
        </Flex>
      )}
      {asking && (
        <Dialog title="Delete the account?" onClose={() => setAsking(false)}>
          <PasswordAsked onDone={() => setAsking(false)} />
        </Dialog>
      )}
    </chakra.section>
  );
}

function PasswordAsked({ onDone }: { onDone: () => void }) {
  const { ask } = useDeletion();
  const { form, values, errors, formError, busy, set, submit } = useAuthForm({
    schema: deleteAccountRequest,
    initial: { password: '' },
    send: async (body) => {
      await ask(body);
      onDone();
    },
    place: (error) => error.details?.fields ?? null,
  });
  return (
    <AuthForm {...{ form, submit }} aria-label="Delete the account">
      <Box marginTop="8px">
        In 7 days every take, room, note and link of yours goes, for you and for whoever you sent them to.
        Notes you wrote on others’ sheets stay, without your name. Until then, sign in to stop it.
      </Box>
      <PasswordField
        label="Your password"
        name="password"
        autoComplete="current-password"
        value={values.password}
        onChange={(text) => set('password', text)}
        error={errors.password}
      />
      <SubmitRow label="Delete it in 7 days" busyLabel="Asking…" busy={busy} error={formError}>
        <TextButton type="button" minHeight="44px" onClick={onDone}>
          Keep it
        </TextButton>
      </SubmitRow>
    </AuthForm>
  );
}
