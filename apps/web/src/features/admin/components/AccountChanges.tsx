import { Box, Flex } from '@chakra-ui/react';
import type { AccountResponse, Role } from '@thudline/contracts';
import { useState } from 'react';
import { Button, TextButton } from '../../../components/Button';
import { CheckBox } from '../../../components/CheckBox';
import { FieldError } from '../../../components/FieldError';
import { InlineNumber } from '../../../components/InlineNumber';
import { useRefusal } from '../../settings/hooks/useRefusal';
import { keptWords } from '../adminWords';
import type { useAccountActions } from '../hooks/useAccounts';

const bytesOfGb = 1e9;
const given: readonly Role[] = ['teacher', 'admin'];

/** Roles, the limit, the lock, and the mail that verifies an address. */
export function AccountChanges({
  account,
  limitBytes,
  actions,
}: {
  account: AccountResponse;
  limitBytes: number | undefined;
  actions: ReturnType<typeof useAccountActions>;
}) {
  const { id, roles, locked, emailVerified, quotaBytes } = account;
  const { refusal, act } = useRefusal(() => Promise.resolve());
  const [sent, setSent] = useState(false);
  const change = (body: Parameters<typeof actions.change>[1]) => void act(() => actions.change(id, body));
  const setRole = (role: Role, on: boolean) =>
    change({ roles: on ? [...roles, role] : roles.filter((each) => each !== role) });
  return (
    <Box
      fontSize="16px"
      paddingLeft={{ md: '16px' }}
      borderLeft={{ md: '2px solid' }}
      borderColor={{ md: 'rule' }}
    >
      <Flex wrap="wrap" columnGap="28px" rowGap="12px" alignItems="center">
        {given.map((role) => (
          <CheckBox key={role} checked={roles.includes(role)} onChange={(on) => setRole(role, on)}>
            {role}
          </CheckBox>
        ))}
        <span>
          May keep{' '}
          <InlineNumber
            label="Limit in GB"
            value={(quotaBytes ?? limitBytes ?? 0) / bytesOfGb}
            digits={1}
            step={1}
            min={0.1}
            max={100_000}
            unit="GB"
            whenLeft
            onChange={(gb) => change({ quotaBytes: Math.round(gb * bytesOfGb) })}
          />{' '}
          {quotaBytes === null
            ? 'like everybody'
            : limitBytes !== undefined && (
                <TextButton minHeight="26px" onClick={() => change({ quotaBytes: null })}>
                  like everybody: {keptWords(limitBytes)}
                </TextButton>
              )}
        </span>
        <Button
          look="outline"
          color={locked ? 'ink' : 'fix'}
          borderColor={locked ? 'ink' : 'fix'}
          onClick={() => change({ locked: !locked })}
        >
          {locked ? 'Unlock' : 'Lock'}
        </Button>
        {!emailVerified && (
          <Box role="status">
            {sent ? (
              'A mail is on its way.'
            ) : (
              <TextButton
                minHeight="26px"
                onClick={() => void act(() => actions.verify(id)).then((done) => setSent(done))}
              >
                send the verification again
              </TextButton>
            )}
          </Box>
        )}
      </Flex>
      {refusal && <FieldError>{refusal}</FieldError>}
    </Box>
  );
}
