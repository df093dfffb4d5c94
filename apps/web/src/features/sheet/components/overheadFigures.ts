import type { Balance, ReportResponse } from '@thudline/contracts';
import { missing, number, signed } from '../../../lib/format';
import type { FigureGroup, FigureRow } from './figureRows';

const orMissing = (value: number | null, digits: number) =>
  value === null ? missing : number(value, digits);

function balanceRows({ drumsLufs, cymbalsLufs, differenceDb, drumHits, cymbalHits }: Balance): FigureRow[] {
  const source = 'K-weighting of ITU-R BS.1770-5, otherwise our definition';
  const definition =
    'Median K-weighted level over 400 ms in the overhead, of hits that stand alone. A full-scale sine reads −3.01.';
  return [
    { label: 'Drums', unit: 'LUFS', values: [orMissing(drumsLufs, 2)], definition, source },
    { label: 'Cymbals', unit: 'LUFS', values: [orMissing(cymbalsLufs, 2)], definition, source },
    {
      label: 'Cymbals against drums',
      unit: 'dB',
      values: [differenceDb === null ? missing : signed(differenceDb, 2)],
      definition: 'The difference of the two. Above 3 dB no fader mends it later.',
      source: 'our definition; the limit is common practice, no source',
    },
    {
      label: 'Hits that stand alone',
      unit: 'drums, cymbals',
      values: [`${drumHits}, ${cymbalHits}`],
      definition: 'Nothing within 150 ms before or after, at most 100 of each. Below five nothing is told.',
      source: 'our definition',
    },
  ];
}

/** What was told from the overhead's own hits; nothing for a take measured before it was. */
export function overheadGroups({ balance }: ReportResponse): FigureGroup[] {
  return balance ? [{ title: 'Drums and cymbals', columns: ['overhead'], rows: balanceRows(balance) }] : [];
}
