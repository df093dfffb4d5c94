import { Box, chakra } from '@chakra-ui/react';
import type { RoomMode } from '@thudline/dsp';
import { number } from '../../../lib/format';
import { alongWords } from '../calculatorWords';
import { modeKey, type RoomResonances } from '../roomResonances';

const shownFirst = 8;

interface ModeTableProps {
  resonances: RoomResonances;
  chosen: RoomMode;
  showsAll: boolean;
  onChoose: (mode: RoomMode) => void;
}

/** The modes as a list to choose from: the arrow keys go through it and the plan follows. */
export function ModeTable({ resonances, chosen, showsAll, onChoose }: ModeTableProps) {
  const { all } = resonances;
  const few = all.filter((mode, i) => i < shownFirst || mode === chosen);
  return (
    <Box
      role="radiogroup"
      aria-label="Resonances"
      fontSize="small"
      lineHeight="20px"
      maxHeight={showsAll ? '420px' : undefined}
      overflowY={showsAll ? 'auto' : undefined}
    >
      <Box display="grid" gridTemplateColumns={columns} {...row} fontSize="caption" fontWeight={600}>
        <Box textAlign="right">Hz</Box>
        <Box>along</Box>
      </Box>
      {(showsAll ? all : few).map((mode) => (
        <ModeRow
          key={modeKey(mode)}
          mode={mode}
          near={resonances.groups.find((group) => group.includes(mode))}
          isChosen={mode === chosen}
          onChoose={() => onChoose(mode)}
        />
      ))}
    </Box>
  );
}

const columns = '52px minmax(0, 1fr)';
const row = {
  columnGap: '14px',
  paddingY: '4px',
  minHeight: '30px',
  alignItems: 'center',
  borderBottom: '1px solid',
  borderColor: 'rule',
} as const;

function ModeRow({
  mode,
  near,
  isChosen,
  onChoose,
}: {
  mode: RoomMode;
  near: readonly RoomMode[] | undefined;
  isChosen: boolean;
  onChoose: () => void;
}) {
  const others = near?.filter((other) => other !== mode).map(({ frequencyHz }) => number(frequencyHz, 1));
  return (
    <chakra.label
      display="grid"
      gridTemplateColumns={columns}
      {...row}
      position="relative"
      cursor="pointer"
      bg={isChosen ? 'target' : undefined}
      fontWeight={isChosen ? 600 : undefined}
      boxShadow={isChosen ? 'inset 4px 0 0 var(--chakra-colors-ink)' : undefined}
      css={{ '&:has(input:focus-visible)': { outline: '2px solid', outlineOffset: '-2px' } }}
    >
      <chakra.input
        type="radio"
        name="mode"
        srOnly
        checked={isChosen}
        onChange={onChoose}
        aria-label={`${number(mode.frequencyHz, 1)} Hz, ${alongWords(mode)}${others ? `, close to ${others.join(', ')}` : ''}`}
      />
      <Box textAlign="right" aria-hidden>
        {number(mode.frequencyHz, 1)}
      </Box>
      <Box aria-hidden>
        {alongWords(mode)}
        {others && (
          <chakra.span color="ink.muted" fontSize="caption" fontWeight={400}>
            {' '}
            by {others.join(', ')}
          </chakra.span>
        )}
      </Box>
    </chakra.label>
  );
}
