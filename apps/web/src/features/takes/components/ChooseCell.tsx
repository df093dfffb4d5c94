import { Box } from '@chakra-ui/react';
import type { TakeListItem } from '@thudline/contracts';
import { CheckBox } from '../../../components/CheckBox';
import { takeName } from '../rowWords';

/** The box that chooses a take; it lies above the row's link, and its whole cell can be hit. */
export function ChooseCell({
  take,
  chosen,
  onChoose,
}: {
  take: TakeListItem;
  chosen: boolean;
  /** Absent: this take can't be chosen now. */
  onChoose?: (chosen: boolean) => void;
}) {
  return (
    <Box
      role="cell"
      gridArea="box"
      position="relative"
      zIndex={1}
      _print={{ visibility: 'hidden' }}
      css={{
        '& > label': {
          width: '100%',
          height: '100%',
          minHeight: '44px',
          paddingLeft: { base: '4px', lg: '14px' },
        },
      }}
    >
      <CheckBox
        checked={chosen}
        disabled={!onChoose}
        label={`choose ${takeName(take)}`}
        onChange={(next) => onChoose?.(next)}
      />
    </Box>
  );
}
