import { Box, chakra } from '@chakra-ui/react';

/** Who wins: a choice, or the word for whoever may only read. */
export function WinnerCell({
  label,
  wins,
  onChoose,
}: {
  label: string;
  wins: boolean;
  onChoose?: () => void;
}) {
  if (!onChoose)
    return (
      <chakra.span role="cell" gridArea="winner" textAlign="center">
        {wins ? 'winner' : ''}
      </chakra.span>
    );
  return (
    <Box role="cell" gridArea="winner" display="grid" placeItems="center">
      <chakra.label display="grid" placeItems="center" width="44px" height="44px" cursor="pointer">
        <chakra.input
          type="radio"
          name="winner"
          aria-label={`${label} wins`}
          checked={wins}
          onChange={onChoose}
          appearance="none"
          width="22px"
          height="22px"
          border="2.4px solid"
          borderColor="ink"
          borderRadius="50%"
          cursor="pointer"
          _checked={{ background: 'radial-gradient(var(--chakra-colors-ink) 0 5px, transparent 5.6px)' }}
        />
      </chakra.label>
    </Box>
  );
}
