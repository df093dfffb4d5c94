import { chakra } from '@chakra-ui/react';
import type { ComparisonResponse } from '@thudline/contracts';
import { missing } from '../../../lib/format';
import { relativeDate } from '../../takes/relativeDate';
import { useNow } from '../../takes/hooks/useNow';
import { MarkedName, PairColumns, PairTable } from './PairTable';
import { TakeMark } from './TakeMark';

type Props = Pick<ComparisonResponse, 'before' | 'after' | 'differed' | 'same' | 'polarity'>;

/** What was written down about both takes and differs, and whether the sound says the same of the polarity. */
export function WhatDiffered({ before, after, differed, same, polarity }: Props) {
  const now = useNow();
  const head = (which: 'before' | 'after', take: typeof before) => (
    <th scope="col">
      <MarkedName mark={<TakeMark which={which} />}>
        take {take.number}, {relativeDate(take.recordedAt, now)}
      </MarkedName>
    </th>
  );
  return (
    <>
      <PairTable aria-label="What differed">
        <PairColumns />
        <thead>
          <tr>
            <th scope="col">What differed</th>
            {head('before', before)}
            {head('after', after)}
          </tr>
        </thead>
        <tbody>
          {differed.map((row) => (
            <tr key={row.what}>
              <th scope="row">{row.what}</th>
              <td>{row.before || missing}</td>
              <td>
                <b>{row.after || missing}</b>
              </td>
            </tr>
          ))}
        </tbody>
      </PairTable>
      <chakra.p fontSize="small" lineHeight="23px" marginTop="10px" textWrap="pretty">
        {[differed.length === 0 && 'Nothing was noted that differs.', same, polarity.sentence]
          .filter(Boolean)
          .join(' ')}
      </chakra.p>
    </>
  );
}
