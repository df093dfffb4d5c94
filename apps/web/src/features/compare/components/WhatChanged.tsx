import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ComparisonResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { useWidth } from '../../../lib/useWidth';
import { KeyEntry } from '../../sheet/components/HitTrace';
import { ink } from '../../sheet/pictures/ink';
import { fromToText, intervalText, rowText, wordText } from '../figureText';
import { ChangeMarksRow } from '../pictures/ChangeMarksRow';
import { axisSteps, type ChangeAxis } from '../pictures/changeRowsLayout';
import { ChangeTable } from './ChangeTable';

type Props = Pick<ComparisonResponse, 'before' | 'after' | 'figures'>;
type Figure = ComparisonResponse['figures'][number];

const columns = '150px 190px minmax(0, 1fr) 96px 108px';
const areas = {
  base: '"label word" "picture picture" "values change"',
  lg: '"label picture values change word"',
};

/** Every figure in steps worth mentioning, on one axis: ring before, disc after. */
export function WhatChanged({ before, after, figures }: Props) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(190);
  const [open, setOpen] = useState(false);
  const axis = { steps: axisSteps(figures), widthPx };
  return (
    <>
      <Box
        role="table"
        aria-label="What changed, and how surely"
        fontSize="small"
        lineHeight="20px"
        marginTop="8px"
      >
        <Row head>
          <span role="columnheader" style={{ gridArea: 'label' }}>
            <chakra.span srOnly>figure</chakra.span>
          </span>
          <Box role="columnheader" gridArea="picture" ref={ref} color="ink.muted" fontSize="caption">
            <Flex justifyContent="center" gap="18px">
              <span>less</span>
              <span>more</span>
            </Flex>
          </Box>
          <HeadCell area="values">
            take {before.number} → {after.number}
          </HeadCell>
          <HeadCell area="change">change (95 %)</HeadCell>
          <HeadCell area="word" right>
            in a word
          </HeadCell>
        </Row>
        {figures.map((figure) => (
          <FigureRow key={figure.key} {...{ figure, axis }} />
        ))}
      </Box>
      <Flex
        fontSize="caption"
        color="ink.muted"
        columnGap="20px"
        rowGap="4px"
        wrap="wrap"
        marginTop="9px"
        alignItems="center"
      >
        <KeyEntry mark={<rect x="3" width="20" height="12" fill={ink.target} />}>
          too small to mention
        </KeyEntry>
        <KeyEntry mark={<rect x="3" width="20" height="12" fill={ink.together} />}>95 % interval</KeyEntry>
        <span>
          ring: take {before.number}, disc: take {after.number}
        </span>
        <TextButton marginLeft={{ lg: 'auto' }} aria-expanded={open} onClick={() => setOpen(!open)}>
          {open ? 'hide the table' : 'as a table'}
        </TextButton>
      </Flex>
      {open && <ChangeTable {...{ before, after, figures }} />}
    </>
  );
}

function FigureRow({ figure, axis }: { figure: Figure; axis: ChangeAxis }) {
  const muted = figure.clear ? undefined : 'ink.muted';
  return (
    <Row>
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
    </Row>
  );
}

function Row({ head = false, children }: { head?: boolean; children: React.ReactNode }) {
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

function HeadCell({
  area,
  right = false,
  children,
}: {
  area: 'values' | 'change' | 'word';
  right?: boolean;
  children: React.ReactNode;
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
