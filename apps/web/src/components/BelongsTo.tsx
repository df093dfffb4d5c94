import { Box } from '@chakra-ui/react';
import { useState } from 'react';
import { TextButton } from './Button';
import { FieldError } from './FieldError';
import { InlineSelect } from './InlineSelect';
import { TextLink } from './TextLink';

interface Named {
  id: string;
  name: string;
}

interface BelongsToProps {
  /** "Recorded with" the one; "no setup"; "say what it was recorded with". */
  words: { to: string; none: string; ask: string; label: string };
  /** What it belongs to now. */
  one: (Named & { path: string }) | null;
  canChange: boolean;
  /** Everything there is to choose from; undefined until it is there. */
  choices: readonly Named[] | undefined;
  error: Error | undefined;
  /** Somebody wants to choose. */
  onAsk: () => void;
  /** Where there is nothing to choose from. */
  first: { path: string; words: string };
  onChoose: (id: string | null) => Promise<unknown>;
}

const nothing = '';

/** "Recorded in **The garage**. change": what something belongs to, the way to change it, and the way back. */
export function BelongsTo(props: BelongsToProps) {
  const { words, one, canChange, choices, error, first, onAsk, onChoose } = props;
  const [changing, setChanging] = useState(false);
  const [failure, setFailure] = useState('');
  const [before, setBefore] = useState<{ id: string | null } | null>(null);
  const choose = async (id: string | null, wayBack: { id: string | null } | null) => {
    setFailure('');
    try {
      await onChoose(id);
      setChanging(false);
      setBefore(wayBack);
    } catch (thrown) {
      setFailure(thrown instanceof Error ? thrown.message : 'That did not work. Try again.');
    }
  };
  const ask = () => {
    setChanging(true);
    onAsk();
  };
  if (!one && !canChange) return null;
  return (
    <Box
      paddingLeft={{ base: 0, lg: '20px' }}
      marginBottom="6px"
      fontSize="small"
      color="ink.muted"
      overflowWrap="anywhere"
    >
      {one && (
        <>
          {words.to}{' '}
          <TextLink to={one.path} color="ink">
            {one.name}
          </TextLink>
          .{' '}
        </>
      )}
      {canChange && !changing && (
        <TextButton aria-label={`${words.label}: ${one ? 'change' : words.ask}`} onClick={ask}>
          {one ? 'change' : words.ask}
        </TextButton>
      )}
      {before && !changing && (
        <span role="status">
          {' '}
          Changed.{' '}
          <TextButton fontWeight={600} onClick={() => void choose(before.id, null)}>
            Undo
          </TextButton>
        </span>
      )}
      {changing && choices && choices.length > 0 && (
        <InlineSelect
          label={words.label}
          value={one?.id ?? nothing}
          options={[nothing, ...choices.map(({ id }) => id)]}
          words={(id) => choices.find((each) => each.id === id)?.name ?? words.none}
          onChange={(id) => void choose(id || null, { id: one?.id ?? null })}
        />
      )}
      {changing && choices?.length === 0 && <TextLink to={first.path}>{first.words}</TextLink>}
      {(failure || error) && <FieldError>{failure || error?.message}</FieldError>}
    </Box>
  );
}
