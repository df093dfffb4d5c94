import { Box } from '@chakra-ui/react';
import type { Target } from '@thudline/contracts';
import { RowPicture, LevelBand } from './LevelPicture';
import { LowEndZero } from './LowEndPicture';
import { RuledRow } from './TakeRow';
import { TableFrame } from './TakesTable';

const rows = Array.from({ length: 11 }, (_, index) => index);

/** Empty rows of the size of full ones, so that nothing jumps. */
export function TakesLoading({ target }: { target: Target }) {
  return (
    <Box role="status" aria-label="Loading the takes" aria-busy>
      <Box aria-hidden>
        <TableFrame target={target}>
          {rows.map((row) => (
            <RuledRow key={row}>
              <Faint area="take" width={`${110 + ((row * 53) % 70)}px`} />
              <Faint area="says" width={`${150 + ((row * 71) % 110)}px`} />
              <Box gridArea="level" position="relative" minHeight={{ base: '44px', lg: 'auto' }}>
                <RowPicture>
                  <LevelBand target={target} />
                </RowPicture>
              </Box>
              <Box gridArea="low" position="relative">
                <RowPicture>
                  <LowEndZero />
                </RowPicture>
              </Box>
            </RuledRow>
          ))}
        </TableFrame>
      </Box>
    </Box>
  );
}

function Faint({ area, width }: { area: string; width: string }) {
  return (
    <Box gridArea={area} alignSelf="center" minHeight={{ base: '32px', lg: 'auto' }}>
      <Box height="10px" width={width} maxWidth="80%" bg="rule" borderRadius="2px" />
    </Box>
  );
}
