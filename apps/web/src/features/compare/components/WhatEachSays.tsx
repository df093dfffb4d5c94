import { Box, Flex, chakra } from '@chakra-ui/react';
import type { ComparisonResponse, ReportResponse } from '@thudline/contracts';
import { StatusMark, statusColor } from '../../../components/StatusMark';
import { missing } from '../../../lib/format';
import { findingRows, saidBriefly, type SaidSide } from '../findingRows';
import { PairColumns, PairTable } from './PairTable';

interface Props {
  comparison: ComparisonResponse;
  reports: readonly [ReportResponse, ReportResponse];
}

/** The most pressing finding of each section, of both takes beside each other. */
export function WhatEachSays({ comparison, reports }: Props) {
  const { before, after } = comparison;
  return (
    <PairTable role="table" aria-label="What each take says">
      <PairColumns />
      <chakra.thead srOnly>
        <tr role="row">
          <th scope="col">About</th>
          <th scope="col">take {before.number}</th>
          <th scope="col">take {after.number}</th>
        </tr>
      </chakra.thead>
      <chakra.tbody borderTop="1px solid" borderColor="rule">
        {findingRows(comparison.findings, reports).map((row) => (
          <tr role="row" key={row.title}>
            <th role="rowheader" scope="row">
              {row.title}
            </th>
            <Side said={row.before} />
            <Side said={row.after} />
          </tr>
        ))}
      </chakra.tbody>
    </PairTable>
  );
}

function Side({ said }: { said: SaidSide | null }) {
  if (!said) return <td role="cell">{missing}</td>;
  return (
    <td role="cell">
      <Flex gap={{ base: '6px', md: '10px' }} direction={{ base: 'column', md: 'row' }}>
        <Box lineHeight={0} paddingTop="1px">
          <StatusMark status={said.finding.status} sizePx={20} />
        </Box>
        <span>
          <chakra.b color={statusColor(said.finding.status)}>{said.word}.</chakra.b>{' '}
          {saidBriefly(said.finding)}
        </span>
      </Flex>
    </td>
  );
}
