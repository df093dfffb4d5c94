import { Box, chakra } from '@chakra-ui/react';
import type { SessionResponse } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { relativeDate } from '../../takes/relativeDate';
import { useSessions } from '../hooks/useSessions';
import { SettingsSection } from './SettingsSection';

const Cell = chakra('td', { base: { paddingY: '9px', paddingRight: '16px', verticalAlign: 'baseline' } });

/** Where the player is signed in; each but this one can be signed out. */
export function DevicesSection() {
  const { sessions, error, retry, refusal, signOut, signOutOthers } = useSessions();
  return (
    <SettingsSection title="Signed in on">
      {error && (
        <FieldError>
          Your devices could not be listed. {error.message} <TextButton onClick={retry}>Try again</TextButton>
        </FieldError>
      )}
      {!sessions && !error && <Box minHeight="88px" role="status" aria-label="Loading your devices" />}
      {sessions && (
        <>
          <chakra.table
            aria-label="Devices"
            width="100%"
            fontSize="16px"
            lineHeight="22px"
            borderCollapse="collapse"
          >
            <tbody>
              {sessions.map((session) => (
                <DeviceRow key={session.id} {...{ session }} onSignOut={() => void signOut(session.id)} />
              ))}
            </tbody>
          </chakra.table>
          {refusal && <FieldError>{refusal}</FieldError>}
          {sessions.length > 1 && (
            <TextButton fontSize="16px" minHeight="40px" onClick={() => void signOutOthers()}>
              sign out everywhere else
            </TextButton>
          )}
        </>
      )}
    </SettingsSection>
  );
}

function DeviceRow({ session, onSignOut }: { session: SessionResponse; onSignOut: () => void }) {
  const { device, current, readOnly, usedAt } = session;
  return (
    <chakra.tr borderTop="1px solid" borderBottom="1px solid" borderColor="rule">
      <Cell fontWeight={current ? 600 : 400}>
        {device}
        {readOnly && ', reads along'}
      </Cell>
      <Cell color="ink.muted" whiteSpace="nowrap">
        {current ? 'this one, now' : relativeDate(usedAt, new Date())}
      </Cell>
      <Cell paddingRight="0" textAlign="right" whiteSpace="nowrap">
        {!current && (
          <TextButton minHeight="26px" aria-label={`sign out ${device}`} onClick={onSignOut}>
            sign out
          </TextButton>
        )}
      </Cell>
    </chakra.tr>
  );
}
