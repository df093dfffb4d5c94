import { Box, Flex, chakra } from '@chakra-ui/react';
import { trackRoles, type TrackRole } from '@thudline/contracts';
import { useId } from 'react';
import { Swell } from '../../../components/Swell';
import type { Slot } from '../arrangement';

const reasonWords: Record<Slot['reason'], string> = {
  name: 'guessed by its name',
  'low-end': 'guessed by its low end',
  order: 'only a guess, please check',
  chosen: 'chosen by you',
};

/** Kick or overhead, with what told it; choosing for one microphone swaps the other. */
export function RoleChooser({
  slot,
  of,
  side,
  disabled,
  onChoose,
}: {
  slot: Slot;
  /** The file's name, for the group's label. */
  of: string;
  /** Of a stereo file. */
  side?: 'left' | 'right';
  disabled: boolean;
  onChoose: (role: TrackRole) => void;
}) {
  const name = useId();
  return (
    <Box>
      <Flex
        as="fieldset"
        aria-label={`Microphone of ${of}${side ? `, ${side} side` : ''}`}
        alignItems="baseline"
        gap="22px"
        paddingLeft="2px"
        lineHeight="23px"
        marginBottom="12px"
      >
        {side && (
          <Box width="32px" fontSize="caption" color="ink.muted">
            {side}
          </Box>
        )}
        {trackRoles.map((role) => (
          <Role
            key={role}
            role={role}
            group={name}
            checked={slot.role === role}
            disabled={disabled}
            onChoose={() => onChoose(role)}
          />
        ))}
      </Flex>
      <Box fontSize="caption" lineHeight="18px" color="ink.muted">
        {reasonWords[slot.reason]}
      </Box>
    </Box>
  );
}

function Role({
  role,
  group,
  checked,
  disabled,
  onChoose,
}: {
  role: TrackRole;
  group: string;
  checked: boolean;
  disabled: boolean;
  onChoose: () => void;
}) {
  return (
    <chakra.label
      position="relative"
      fontSize="16px"
      fontWeight={checked ? 600 : 400}
      color={checked ? 'ink' : 'ink.muted'}
      cursor={disabled ? 'default' : 'pointer'}
      _before={{ content: '""', position: 'absolute', inset: '-11px -8px' }}
      css={{
        '&:has(input:focus-visible)': {
          outline: '3px solid',
          outlineColor: 'overhead',
          outlineOffset: '3px',
        },
      }}
    >
      <chakra.input
        type="radio"
        name={group}
        srOnly
        checked={checked}
        disabled={disabled}
        onChange={onChoose}
      />
      {role}
      {checked && <Swell depthPx={4.5} linePx={1.75} />}
    </chakra.label>
  );
}
