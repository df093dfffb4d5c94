import { chakra } from '@chakra-ui/react';
import type { ChangeFigure } from '@thudline/contracts';
import { figureName, figureText } from '../roomWords';

const cell = { textAlign: 'right', paddingY: '3px', paddingLeft: '12px', whiteSpace: 'nowrap' } as const;

/** The rows of a change as numbers. */
export function FigureTable({ figures }: { figures: readonly ChangeFigure[] }) {
  const hits = (count: number | null) => (count === null ? '–' : count);
  return (
    <chakra.details
      fontSize="small"
      marginLeft={{ md: 'auto' }}
      paddingY="6px"
      // Opened it needs the whole width.
      css={{ '&[open]': { flexBasis: '100%' } }}
      _print={{ display: 'none' }}
    >
      <chakra.summary cursor="pointer" color="ink.muted" width="fit-content" paddingY="4px">
        as a table
      </chakra.summary>
      <chakra.div overflowX="auto">
        <chakra.table marginTop="4px">
          <thead>
            <chakra.tr borderBottom="1px solid" borderColor="rule" color="ink.muted" fontSize="caption">
              <chakra.th scope="col" textAlign="left" fontWeight={400}>
                Figure
              </chakra.th>
              {['before', 'after', 'hits before', 'hits after'].map((head) => (
                <chakra.th key={head} scope="col" fontWeight={400} {...cell}>
                  {head}
                </chakra.th>
              ))}
              <chakra.th scope="col" textAlign="left" fontWeight={400} paddingLeft="12px">
                told
              </chakra.th>
            </chakra.tr>
          </thead>
          <tbody>
            {figures.map((figure) => (
              <chakra.tr key={figure.key} borderBottom="1px solid" borderColor="rule">
                <chakra.th scope="row" textAlign="left" fontWeight={400}>
                  {figureName(figure)}, {figure.unit}
                </chakra.th>
                {[figure.before, figure.after].map((value, i) => (
                  <chakra.td key={i} fontWeight={600} {...cell}>
                    {value === null ? '–' : figureText(value, figure.unit)}
                  </chakra.td>
                ))}
                <chakra.td {...cell}>{hits(figure.hitsBefore)}</chakra.td>
                <chakra.td {...cell}>{hits(figure.hitsAfter)}</chakra.td>
                <chakra.td paddingLeft="12px">{figure.clear ? figure.word : 'no clear change'}</chakra.td>
              </chakra.tr>
            ))}
          </tbody>
        </chakra.table>
      </chakra.div>
    </chakra.details>
  );
}
