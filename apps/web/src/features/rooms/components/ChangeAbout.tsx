import { Box } from '@chakra-ui/react';
import type { RoomChangeResponse } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { TextLink } from '../../../components/TextLink';
import { categoryWords } from '../roomWords';

/** What can be done with an entry; absent for a phone that only reads along. */
export interface EntryActions {
  onEdit: () => void;
  /** Among the changes of its day; absent where none stands there. */
  onEarlier?: () => void;
  onLater?: () => void;
}

/** Under a change's name: its kind, place and cost, and the takes on both sides. */
export function ChangeAbout({ change, actions }: { change: RoomChangeResponse; actions?: EntryActions }) {
  const { category, cost, place, before, after, number } = change;
  const words = [categoryWords[category], place && 'on the plan', cost].filter(Boolean).join(' · ');
  return (
    <Box fontSize="caption" color="ink.muted" lineHeight="22px">
      {words}
      {before.length > 0 && <Takes side="before" takes={before} />}
      {after.length > 0 && <Takes side="after" takes={after} />}
      {actions && (
        <>
          <Act words="edit" label={`edit change ${number}`} onClick={actions.onEdit} />
          <Act words="earlier" label={`put change ${number} earlier that day`} onClick={actions.onEarlier} />
          <Act words="later" label={`put change ${number} later that day`} onClick={actions.onLater} />
        </>
      )}
    </Box>
  );
}

function Act({ words, label, onClick }: { words: string; label: string; onClick?: () => void }) {
  if (!onClick) return null;
  return (
    <Box as="span" _print={{ display: 'none' }}>
      {' · '}
      <TextButton
        onClick={onClick}
        aria-label={label}
        display="inline-block"
        minWidth="24px"
        minHeight="24px"
        paddingX="4px"
      >
        {words}
      </TextButton>
    </Box>
  );
}

function Takes({ side, takes }: { side: 'before' | 'after'; takes: RoomChangeResponse['before'] }) {
  return (
    <>
      {` · ${side}: take${takes.length > 1 ? 's' : ''} `}
      {takes.map(({ id, number }, i) => (
        <span key={id}>
          {i > 0 && ', '}
          <TextLink to={`/takes/${id}`} aria-label={`take ${number}`}>
            {number}
          </TextLink>
        </span>
      ))}
    </>
  );
}
