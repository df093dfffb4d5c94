import { Box, chakra } from '@chakra-ui/react';
import type { ComparedFigure } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { fromToText, intervalText, rowText, wordText } from '../figureText';
import { ChangeMarksRow } from '../pictures/ChangeMarksRow';
import type { ChangeAxis } from '../pictures/changeRowsLayout';

const columns = '150px 190px minmax(0, 1fr) 96px 108px';
const areas = {
  base: '"label word" "picture picture" "values change"',
  lg: '"label picture values change word"',
};

/** One figure: how far it moved in steps worth mentioning, from what to what, and in a word. */
export function FigureRow({ figure, axis }: { figure: ComparedFigure; axis: ChangeAxis }) {
  const muted = figure.clear ? undefined : 'ink.muted';
  return (
    <ChangeGrid>
      <Box role="rowheader" gridArea="label">
        {figure.label}
      </Box>
      <Box role="cell" gridArea="picture">
        <ChangeMarksRow {...{ figure, axis }} />
        <chakra.span srOnly>{rowText(figure)}</chakra.span>
      </Box>
      <Box
        role="cell"
        gridArea="values"
        whiteSpace="nowrap"
        color={figure.change === null ? 'ink.muted' : undefined}
      >
        {fromToText(figure)}
      </Box>
      <Box role="cell" gridArea="change" color="ink.muted" textAlign={{ base: 'right', lg: 'left' }}>
        {intervalText(figure)}
      </Box>
      <Box
        role="cell"
        gridArea="word"
        textAlign="right"
        whiteSpace="nowrap"
        color={muted}
        fontWeight={figure.clear ? 600 : 400}
      >
        {wordText(figure)}
      </Box>
    </ChangeGrid>
  );
}

export function ChangeGrid({ head = false, children }: { head?: boolean; children: ReactNode }) {
  return (
    <Box
      role="row"
      display="grid"
      gridTemplateColumns={{ base: '1fr auto', lg: columns }}
      gridTemplateAreas={head ? { base: '"picture picture" "values word"', lg: areas.lg } : areas}
      columnGap="8px"
      alignItems="center"
      minHeight="29px"
      paddingY={{ base: head ? 0 : '5px', lg: 0 }}
      borderBottom="1px solid"
      borderColor="rule"
      _print={{ gridTemplateColumns: columns, gridTemplateAreas: areas.lg }}
    >
      {children}
    </Box>
  );
}

export function HeadCell({
  area,
  right = false,
  children,
}: {
  area: 'values' | 'change' | 'word';
  right?: boolean;
  children: ReactNode;
}) {
  return (
    <Box
      role="columnheader"
      gridArea={area}
      fontWeight={600}
      fontSize="caption"
      textAlign={right ? 'right' : 'left'}
      display={area === 'change' ? { base: 'none', lg: 'block' } : undefined}
    >
      {children}
    </Box>
  );
}
