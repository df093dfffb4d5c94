import { Box, Flex, chakra } from '@chakra-ui/react';
import type { NextAction, TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { CheckBox } from '../../../components/CheckBox';
import { NotePlace } from '../notePlaces';
import { useTakeEdits } from '../hooks/useTakeEdits';

/** "Before the next take": what to do, in order of what matters, to tick as you go. */
export function NextActions({ take, actions }: { take: TakeResponse; actions: NextAction[] }) {
  const { update } = useTakeEdits(take);
  const [failure, setFailure] = useState('');
  const toggle = async (id: string, done: boolean) => {
    const others = take.tickedActions.filter((each) => each !== id);
    setFailure('');
    try {
      await update({ tickedActions: done ? [...others, id] : others });
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'The tick could not be kept. Try again.');
    }
  };
  const { change } = take.rights;
  return (
    <Box
      as="section"
      aria-labelledby="next-head"
      marginTop="18px"
      // Notes may ask for something where the sheet itself doesn’t.
      css={{ '&:not(:has(li))': { display: 'none' } }}
    >
      <Flex justifyContent="space-between" alignItems="baseline" gap="16px" paddingBottom="7px">
        <chakra.h2 id="next-head" fontWeight={600} fontSize="body">
          Before the next take
        </chakra.h2>
        <Box
          color="ink.muted"
          fontSize="caption"
          display={{ base: 'none', sm: change ? 'block' : 'none' }}
          _print={{ display: 'none' }}
        >
          Tick as you go: the next take then knows what you changed.
        </Box>
      </Flex>
      <chakra.ul listStyleType="none" borderTop="1px solid" borderColor="rule">
        {actions.map((action) => (
          <ActionRow
            key={action.id}
            action={action}
            done={take.tickedActions.includes(action.id)}
            onToggle={change ? (done) => void toggle(action.id, done) : undefined}
          />
        ))}
      </chakra.ul>
      <NotePlace as="ul" name="next" />
      {failure && (
        <Box role="alert" color="fix" fontSize="small" marginTop="8px">
          {failure}
        </Box>
      )}
    </Box>
  );
}

function ActionRow({
  action,
  done,
  onToggle,
}: {
  action: NextAction;
  done: boolean;
  /** Left out for a reader who may not tick. */
  onToggle?: (done: boolean) => void;
}) {
  const quiet = done || action.leave;
  const words = (
    <>
      <chakra.span color={quiet ? 'ink.muted' : 'ink'} fontWeight={quiet ? 400 : 600}>
        {action.action}
      </chakra.span>{' '}
      <chakra.span color="ink.muted">{action.detail}</chakra.span>
    </>
  );
  return (
    <chakra.li borderBottom="1px solid" borderColor="rule" paddingY={{ base: '8px', _print: '5px' }}>
      {onToggle ? (
        <CheckBox checked={done} onChange={onToggle}>
          {words}
        </CheckBox>
      ) : (
        words
      )}
    </chakra.li>
  );
}
