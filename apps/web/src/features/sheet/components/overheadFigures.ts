import type { Balance, ReportResponse, Room } from '@thudline/contracts';
import { missing, number, signed } from '../../../lib/format';
import { bandName } from './bandName';
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

type Band = Room['bands'][number];
type BandRow = Omit<FigureRow, 'values'> & { of: (band: Band) => number | null | undefined };

const decaySource = 'Schroeder 1965, as in ISO 3382-1';
const bandRows: BandRow[] = [
  {
    label: 'Decay',
    unit: 's',
    of: ({ t20S }) => t20S?.median,
    definition:
      'Seconds per 60 dB: how a loud snare dies away between −5 and −25 dB, by backward integration: median over six loud hits or more, alone for 150 ms before and 200 ms after.',
    source: decaySource,
  },
  {
    label: 'Decay, spread',
    unit: 's',
    of: ({ t20S }) => t20S?.iqr,
    definition: 'Interquartile range over hits.',
    source: 'our definition',
  },
  {
    label: 'Early decay',
    unit: 's',
    of: ({ earlyS }) => earlyS?.median,
    definition: 'The same between 0 and −10 dB.',
    source: decaySource,
  },
  {
    label: 'Early to late',
    unit: 'dB',
    of: ({ earlyToLateDb }) => earlyToLateDb?.median,
    definition: 'Energy of the first 50 ms over all that comes later: median over hits.',
    source: 'C50 of ISO 3382-1',
  },
];

function roomRows({ bands }: Room): FigureRow[] {
  return bandRows.map(({ of, ...row }) => ({
    ...row,
    values: bands.map((band) => orMissing(of(band) ?? null, 2)),
  }));
}

/** What was told from the overhead's own hits; nothing for a take measured before it was. */
export function overheadGroups({ balance, room }: ReportResponse): FigureGroup[] {
  const bands = room?.bands.map((band) => bandName(band.centreHz)) ?? [];
  return [
    ...(balance ? [{ title: 'Drums and cymbals', columns: ['overhead'], rows: balanceRows(balance) }] : []),
    ...(room
      ? [{ title: 'Room, in the overhead', columns: bands, rows: roomRows(room), onScreenOnly: true }]
      : []),
  ];
}
