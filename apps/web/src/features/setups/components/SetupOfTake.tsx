import { Box } from '@chakra-ui/react';
import type { TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { InlineSelect } from '../../../components/InlineSelect';
import { TextLink } from '../../../components/TextLink';
import { useTakeEdits } from '../../sheet/hooks/useTakeEdits';
import { useSetups } from '../hooks/useSetups';

const none = '';

/** What a take was recorded with, at the head of the sheet's margin, and the way to change it. */
export function SetupOfTake({ take }: { take: TakeResponse }) {
  const [changing, setChanging] = useState(false);
  const [failure, setFailure] = useState('');
  const { update } = useTakeEdits(take);
  const { setups, error } = useSetups(changing);
  const choose = async (setupId: string) => {
    setFailure('');
    try {
      await update({ setupId: setupId || null });
      setChanging(false);
    } catch (thrown) {
      setFailure(thrown instanceof Error ? thrown.message : 'That did not work. Try again.');
    }
  };
  const { setup } = take;
  if (!setup && !take.rights.change) return null;
  return (
    <Box
      paddingLeft={{ base: 0, lg: '20px' }}
      marginBottom="6px"
      fontSize="small"
      color="ink.muted"
      overflowWrap="anywhere"
    >
      {setup && (
        <>
          Recorded with{' '}
          <TextLink to={`/setups/${setup.id}`} color="ink">
            {setup.name}
          </TextLink>
          .{' '}
        </>
      )}
      {take.rights.change && !changing && (
        <TextButton onClick={() => setChanging(true)}>
          {setup ? 'change' : 'say what it was recorded with'}
        </TextButton>
      )}
      {changing && setups && setups.length > 0 && (
        <InlineSelect
          label="Recorded with"
          value={setup?.id ?? none}
          options={[none, ...setups.map(({ id }) => id)]}
          words={(id) => setups.find((each) => each.id === id)?.name ?? 'no setup'}
          onChange={(id) => void choose(id)}
        />
      )}
      {changing && setups?.length === 0 && <TextLink to="/setups/new">Write down your first setup</TextLink>}
      {(failure || error) && <FieldError>{failure || error?.message}</FieldError>}
    </Box>
  );
}
