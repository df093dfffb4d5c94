import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ComparisonResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { useWidth } from '../../../lib/useWidth';
import { KeyEntry } from '../../sheet/components/HitTrace';
import { ink } from '../../sheet/pictures/ink';
import { shownFigures } from '../shownFigures';
import { axisSteps } from '../pictures/changeRowsLayout';
import { ChangeTable } from './ChangeTable';
import { ChangeGrid, FigureRow, HeadCell } from './FigureRow';

type Props = Pick<ComparisonResponse, 'before' | 'after' | 'figures'>;

/** Every figure in steps worth mentioning, on one axis: ring before, disc after. */
export function WhatChanged({ before, after, figures }: Props) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(190);
  const [open, setOpen] = useState(false);
  const [all, setAll] = useState(false);
  const main = shownFigures(figures);
  const shown = all ? figures : main;
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
        <ChangeGrid head>
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
        </ChangeGrid>
        {shown.map((figure) => (
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
        {main.length < figures.length && (
          <TextButton marginLeft={{ lg: 'auto' }} aria-expanded={all} onClick={() => setAll(!all)}>
            {all ? 'fewer figures' : `all ${figures.length} figures`}
          </TextButton>
        )}
        <TextButton aria-expanded={open} onClick={() => setOpen(!open)}>
          {open ? 'hide the table' : 'as a table'}
        </TextButton>
      </Flex>
      {open && <ChangeTable {...{ before, after, figures }} />}
    </>
  );
}
