import { Box, chakra } from '@chakra-ui/react';
import { TextButton } from '../../../components/Button';
import { CheckBox } from '../../../components/CheckBox';
import type { NewTake } from '../hooks/useNewTake';

/** "What you changed since take 20": the ticks of its sheet, which can still be corrected. */
export function WhatChanged({ newTake }: { newTake: NewTake }) {
  const { previous, done, tick, follows, setFollows } = newTake;
  if (!previous) return null;
  const sending = newTake.state.sending.phase === 'sending';
  if (!follows)
    return (
      <Box marginTop="26px" fontSize="small" color="ink.muted">
        This take follows no other.{' '}
        <TextButton disabled={sending} onClick={() => setFollows(true)}>
          it follows take {previous.take.number}
        </TextButton>
      </Box>
    );
  return (
    <Box
      as="section"
      aria-labelledby="what-changed"
      marginTop="26px"
      maxWidth={{ base: 'none', lg: '484px' }}
    >
      <chakra.h2 id="what-changed" fontSize="20px" lineHeight="27px" fontWeight={600} marginBottom="6px">
        What you changed since take {previous.take.number}
      </chakra.h2>
      <chakra.ul listStyleType="none" borderTop="1px solid" borderColor="rule">
        {previous.actions.map((action) => (
          <chakra.li key={action.id} borderBottom="1px solid" borderColor="rule" paddingY="8px">
            <CheckBox
              checked={done.includes(action.id)}
              disabled={sending}
              onChange={(on) => tick(action.id, on)}
            >
              <chakra.span fontWeight={action.leave ? 400 : 600}>{action.action}</chakra.span>{' '}
              <chakra.span color="ink.muted">{action.detail}</chakra.span>
            </CheckBox>
          </chakra.li>
        ))}
        <chakra.li borderBottom="1px solid" borderColor="rule" paddingY="10px" color="ink.muted">
          Something else: write it in the note.
        </chakra.li>
      </chakra.ul>
      <Box marginTop="8px" fontSize="caption" color="ink.muted">
        <TextButton disabled={sending} onClick={() => setFollows(false)}>
          it doesn’t follow take {previous.take.number}
        </TextButton>
      </Box>
    </Box>
  );
}
