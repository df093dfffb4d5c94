import { Box, chakra } from '@chakra-ui/react';
import type { AccountResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { dateTime, plural } from '../../../lib/format';
import { relativeDate } from '../../takes/relativeDate';
import { keptWords, rolesWords } from '../adminWords';
import type { useAccountActions } from '../hooks/useAccounts';
import { AccountChanges } from './AccountChanges';
import { Cell, Row } from './AdminTable';

interface AccountRowProps {
  account: AccountResponse;
  /** The installation's; undefined while it isn't known. */
  limitBytes: number | undefined;
  actions: ReturnType<typeof useAccountActions>;
}

/** One account, and below it, once opened, what can be changed. */
export function AccountRow({ account, limitBytes, actions }: AccountRowProps) {
  const [open, setOpen] = useState(false);
  const { name, email, emailVerified, roles, locked, takes, bytes, seenAt, deleteAfter } = account;
  return (
    <>
      <Row>
        <Cell>
          <b>{name}</b> <chakra.span overflowWrap="anywhere">{email}</chakra.span>
          <Box fontSize="caption" color="ink.muted">
            {[!emailVerified && 'address not verified', deleteAfter && `goes on ${dateTime(deleteAfter)}`]
              .filter(Boolean)
              .join(', ')}
            {locked && (
              <chakra.span color="fix" fontWeight={600}>
                locked
              </chakra.span>
            )}
          </Box>
        </Cell>
        <Cell>{rolesWords(roles)}</Cell>
        <Cell whiteSpace="nowrap">{plural(takes, 'take')}</Cell>
        <Cell whiteSpace="nowrap">
          <KeepLine bytes={bytes} limitBytes={account.quotaBytes ?? limitBytes} />
        </Cell>
        <Cell whiteSpace="nowrap" color="ink.muted">
          {seenAt ? relativeDate(seenAt, new Date()) : 'signed out'}
        </Cell>
        <Cell>
          <TextButton
            minHeight="26px"
            aria-expanded={open}
            aria-label={`${open ? 'close' : 'change'} ${name}, ${email}`}
            onClick={() => setOpen(!open)}
          >
            {open ? 'close' : 'change'}
          </TextButton>
        </Cell>
      </Row>
      {open && (
        <tr>
          <chakra.td colSpan={6} paddingBottom="18px">
            <AccountChanges {...{ account, limitBytes, actions }} />
          </chakra.td>
        </tr>
      )}
    </>
  );
}

/** How full it is: a disc on a line from nothing to the limit. */
function KeepLine({ bytes, limitBytes }: { bytes: number; limitBytes: number | undefined }) {
  const share = limitBytes ? Math.min(1, bytes / limitBytes) : 0;
  return (
    <Box display="inline-block" minWidth="132px">
      {keptWords(bytes)}
      {limitBytes !== undefined && <chakra.span color="ink.muted"> of {keptWords(limitBytes)}</chakra.span>}
      <Box aria-hidden position="relative" height="9px" marginTop="2px">
        <Box position="absolute" insetX="0" top="4px" height="1px" bg="edge" />
        <Box
          position="absolute"
          top="0"
          width="9px"
          height="9px"
          borderRadius="50%"
          bg={share >= 0.9 ? 'watch' : 'ink'}
          style={{ left: `calc(${share * 100}% - ${share * 9}px)` }}
        />
      </Box>
    </Box>
  );
}
