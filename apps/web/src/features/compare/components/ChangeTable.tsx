import { Box, chakra } from '@chakra-ui/react';
import type { ComparedFigure, ComparisonResponse } from '@thudline/contracts';
import { missing, number, signed } from '../../../lib/format';
import { intervalText, wordText } from '../figureText';

/** One decimal more than the picture says. */
const fine = ({ decimals }: ComparedFigure) => decimals + 1;

const value = (of: number | null, figure: ComparedFigure) =>
  of === null ? missing : number(of, fine(figure));

function change(figure: ComparedFigure): string {
  if (figure.change === null) return missing;
  return figure.isShare ? `${signed(figure.change * 100)} %` : signed(figure.change, fine(figure));
}

const step = (figure: ComparedFigure) =>
  figure.isShare ? `${number(figure.step * 100, 0)} %` : number(figure.step, 1);

const hits = ({ hitsBefore, hitsAfter }: ComparedFigure) =>
  hitsBefore === null || hitsAfter === null ? 'whole take' : `${hitsBefore}, ${hitsAfter}`;

/** The same figures in full, with the hits they rest on. */
export function ChangeTable({
  before,
  after,
  figures,
}: Pick<ComparisonResponse, 'before' | 'after' | 'figures'>) {
  return (
    <Box overflowX="auto" marginTop="10px" tabIndex={0} role="group" aria-label="Table of what changed">
      <chakra.table
        fontSize="small"
        width="100%"
        minWidth="640px"
        css={{
          '& th, & td': { textAlign: 'right', padding: '3px 0 3px 12px' },
          '& th:first-of-type': { textAlign: 'left', paddingLeft: 0 },
        }}
      >
        <chakra.caption textAlign="left" color="ink.muted" fontSize="caption" captionSide="top">
          Figures of single hits: medians over hits struck alike, with a bootstrap 95 % interval of their
          difference. A change is told where the interval leaves out no change and it exceeds its step.
        </chakra.caption>
        <chakra.thead borderBottom="1px solid" borderColor="rule">
          <tr>
            <th scope="col">figure</th>
            <th scope="col">take {before.number}</th>
            <th scope="col">take {after.number}</th>
            <th scope="col">unit</th>
            <th scope="col">change</th>
            <th scope="col">95 %</th>
            <th scope="col">step</th>
            <th scope="col">hits</th>
            <th scope="col">in a word</th>
          </tr>
        </chakra.thead>
        <tbody>
          {figures.map((figure) => (
            <tr key={figure.key}>
              <th scope="row">{figure.label}</th>
              <td>{value(figure.before, figure)}</td>
              <td>{value(figure.after, figure)}</td>
              <td>{figure.unit}</td>
              <td>{change(figure)}</td>
              <td>{intervalText(figure) || missing}</td>
              <td>{step(figure)}</td>
              <td>{hits(figure)}</td>
              <td>{wordText(figure)}</td>
            </tr>
          ))}
        </tbody>
      </chakra.table>
    </Box>
  );
}
