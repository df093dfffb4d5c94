import { Box, chakra } from '@chakra-ui/react';
import type { Target } from '@thudline/contracts';
import { levelLabels, levelPercent, lowEndLabels, lowEndPercent, type AxisLabel } from '../pictureScale';
import { rowGrid } from './tableGrid';

const VisuallyHidden = chakra('span', { base: { srOnly: true } });

/** Names of the columns, and the two axes the pictures below line up into. */
export function TakesHead({ target }: { target: Target }) {
  return (
    <Box role="rowgroup">
      <Box
        role="row"
        {...rowGrid}
        gridTemplateAreas={{ base: '"level level low low"', lg: rowGrid.gridTemplateAreas.lg }}
        height="58px"
        borderBottom="1px solid"
        borderColor="rule"
        fontSize="caption"
        lineHeight="18px"
        fontWeight={600}
      >
        <Box role="columnheader" gridArea={{ lg: 'box' }} srOnly>
          Chosen
        </Box>
        <ColumnName area="take">Take</ColumnName>
        <ColumnName area="says">What it says</ColumnName>
        <LevelAxis target={target} />
        <LowEndAxis />
        <Box
          role="columnheader"
          gridArea={{ lg: 'action' }}
          alignSelf="end"
          paddingBottom="14px"
          paddingRight="12px"
          textAlign="right"
          srOnly={{ base: true, lg: false }}
        >
          Notes<VisuallyHidden>, and what can be done</VisuallyHidden>
        </Box>
      </Box>
    </Box>
  );
}

function ColumnName({ area, children }: { area: string; children: string }) {
  return (
    <Box
      role="columnheader"
      gridArea={{ lg: area }}
      alignSelf="end"
      paddingBottom="14px"
      srOnly={{ base: true, lg: false }}
    >
      {children}
    </Box>
  );
}

function LevelAxis({ target }: { target: Target }) {
  const middle = (levelPercent(target.lowDbfs) + levelPercent(target.highDbfs)) / 2;
  return (
    <Box role="columnheader" gridArea="level" position="relative">
      <VisuallyHidden>Hardest hit of kick and overhead, dBFS</VisuallyHidden>
      <Box aria-hidden position="absolute" left={`${levelPercent(-24)}%`} top="0" whiteSpace="nowrap">
        <chakra.span color="kick">
          <Disc /> kick
        </chakra.span>
        <chakra.span color="overhead" marginX="7px">
          <Ring /> overhead
        </chakra.span>
        hardest hit, dBFS
      </Box>
      <AxisNumber label={{ text: 'target', percent: middle }} top="21px" color="ink" />
      {levelLabels(target).map((label) => (
        <AxisNumber key={label.text} label={label} />
      ))}
    </Box>
  );
}

function LowEndAxis() {
  return (
    <Box role="columnheader" gridArea="low" position="relative">
      <VisuallyHidden>Low end of the two added, dB</VisuallyHidden>
      <AxisNumber label={{ text: 'low end', percent: lowEndPercent(0) }} top="21px" color="ink" />
      {lowEndLabels.map((label) => (
        <AxisNumber key={label.text} label={label} />
      ))}
    </Box>
  );
}

function AxisNumber({
  label,
  top = '38px',
  color = 'ink.muted',
}: {
  label: AxisLabel;
  top?: string;
  color?: string;
}) {
  return (
    <Box
      aria-hidden
      position="absolute"
      top={top}
      left={`${label.percent}%`}
      transform={`translateX(${label.anchor === 'start' ? -2 : label.anchor === 'end' ? -98 : -50}%)`}
      whiteSpace="nowrap"
      color={color}
    >
      {label.text}
    </Box>
  );
}

const Disc = () => (
  <chakra.svg display="inline" width="7px" height="7px" viewBox="0 0 7 7" verticalAlign="1px">
    <circle cx="3.5" cy="3.5" r="3" fill="currentColor" />
  </chakra.svg>
);

const Ring = () => (
  <chakra.svg display="inline" width="7px" height="7px" viewBox="0 0 7 7" verticalAlign="1px">
    <circle cx="3.5" cy="3.5" r="2.9" fill="none" stroke="currentColor" strokeWidth="1.1" />
  </chakra.svg>
);
