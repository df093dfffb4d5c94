import { Box } from '@chakra-ui/react';
import { useDeferredValue, useState } from 'react';
import { Button } from '../../../components/Button';
import { TextField } from '../../../components/TextField';
import { useAccountActions, useAccounts } from '../hooks/useAccounts';
import { AccountRow } from './AccountRow';
import { AdminSection } from './AdminSection';
import { AdminTable, TableState } from './AdminTable';

/** Everybody with an account: found, given roles, locked, limited. */
export function AccountsSection({ limitBytes }: { limitBytes: number | undefined }) {
  const [find, setFind] = useState('');
  const found = useAccounts(useDeferredValue(find.trim()));
  const actions = useAccountActions(found.readAgain);
  const { accounts, error, retry, hasMore, more } = found;
  const empty = find.trim() ? 'Nobody’s name or address has that in it.' : 'Nobody has joined yet.';
  return (
    <AdminSection title="Accounts">
      <Box maxWidth="400px" marginBottom="16px">
        <TextField label="Find by name or address" type="search" value={find} onChange={setFind} />
      </Box>
      <TableState what="accounts" rows={accounts} {...{ error, empty }} onRetry={retry} />
      {accounts && accounts.length > 0 && (
        <AdminTable label="Accounts" heads={['who', 'role', 'takes', 'keeps', 'last here', '']}>
          {accounts.map((account) => (
            <AccountRow key={account.id} {...{ account, limitBytes, actions }} />
          ))}
        </AdminTable>
      )}
      {hasMore && (
        <Box marginTop="14px">
          <Button look="outline" onClick={more}>
            Show more
          </Button>
        </Box>
      )}
    </AdminSection>
  );
}
