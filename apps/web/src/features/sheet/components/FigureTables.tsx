import { Box, chakra } from '@chakra-ui/react';
import type { ReportResponse, TakeResponse, UserSettings } from '@thudline/contracts';
import { figureGroups, type FigureGroup, type FigureRow } from './figureRows';
import { FiguresOut } from './FiguresOut';
import { FileFacts } from './FileFacts';
import { MeasuredWith } from './MeasuredWith';
import { PictureTitle } from './SheetSection';

/** Everything that was measured, with unit, definition and source; and the files it was measured from. */
export function FigureTables({
  take,
  report,
  settings,
}: {
  take: TakeResponse;
  report: ReportResponse;
  settings: UserSettings;
}) {
  const groups = figureGroups(report, settings);
  return (
    <>
      <FiguresOut {...{ take, report, groups }} />
      <Box _print={{ columnCount: 2, columnGap: '32px' }}>
        {groups.map((group) => (
          <FigureTable key={group.title} group={group} />
        ))}
      </Box>
      <PictureTitle>Files</PictureTitle>
      <FileFacts take={take} />
      <MeasuredWith {...{ take, report }} />
    </>
  );
}

const cell = {
  textAlign: 'right',
  paddingY: { base: '7px', _print: '2px' },
  paddingLeft: '8px',
  verticalAlign: 'top',
  whiteSpace: 'nowrap',
} as const;

function FigureTable({ group }: { group: FigureGroup }) {
  return (
    <Box breakInside="avoid" _print={group.onScreenOnly ? { display: 'none' } : undefined}>
      <PictureTitle>{group.title}</PictureTitle>
      <chakra.table width="100%" fontSize={{ base: 'small', _print: 'caption' }} marginTop="4px">
        <thead>
          <chakra.tr borderBottom="1px solid" borderColor="rule" color="ink.muted" fontSize="caption">
            <chakra.th scope="col" textAlign="left" fontWeight={400} paddingY="4px">
              Figure
            </chakra.th>
            {group.columns.map((column) => (
              <chakra.th key={column} scope="col" fontWeight={400} {...cell} paddingY="4px">
                {column}
              </chakra.th>
            ))}
            <chakra.th
              scope="col"
              textAlign="left"
              fontWeight={400}
              paddingLeft="12px"
              width={{ base: '64px', md: '120px', _print: '72px' }}
            >
              unit
            </chakra.th>
          </chakra.tr>
        </thead>
        <tbody>
          {group.rows.map((row) => (
            <Row key={row.label + row.unit} row={row} />
          ))}
        </tbody>
      </chakra.table>
    </Box>
  );
}

function Row({ row }: { row: FigureRow }) {
  return (
    <chakra.tr borderBottom="1px solid" borderColor="rule">
      <chakra.th
        scope="row"
        textAlign="left"
        fontWeight={400}
        paddingY={{ base: '3px', _print: 0 }}
        paddingRight="12px"
      >
        <details>
          <chakra.summary
            cursor="pointer"
            paddingY={{ base: '4px', _print: '2px' }}
            listStylePosition="outside"
            _print={{ listStyleType: 'none' }}
            title="What is this?"
          >
            {row.label}
          </chakra.summary>
          <Box color="ink.muted" fontSize="caption" maxWidth="380px" paddingBottom="6px">
            {row.definition} Source: {row.source}.
          </Box>
        </details>
      </chakra.th>
      {row.values.map((value, i) => (
        <chakra.td key={i} fontWeight={600} {...cell}>
          {value}
        </chakra.td>
      ))}
      <chakra.td
        color="ink.muted"
        paddingLeft="12px"
        paddingY={{ base: '7px', _print: '2px' }}
        verticalAlign="top"
        fontSize="caption"
      >
        {row.unit}
      </chakra.td>
    </chakra.tr>
  );
}
