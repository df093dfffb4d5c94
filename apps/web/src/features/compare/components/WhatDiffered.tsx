import { chakra } from '@chakra-ui/react';
import type { ComparisonResponse } from '@thudline/contracts';
import { dateTime, missing } from '../../../lib/format';
import { useNow } from '../../takes/hooks/useNow';
import { relativeDate } from '../../takes/relativeDate';
import { Letters } from './Letters';
import { MarkedName, PairColumns, PairTable } from './PairTable';
import { TakeMark } from './TakeMark';

interface Props extends Pick<ComparisonResponse, 'before' | 'after' | 'differed' | 'same' | 'polarity'> {
  /** Of the notes beside it. */
  letters: readonly string[];
}

/** What was written down about both takes and differs, and whether the sound says the same of the polarity. */
export function WhatDiffered({ before, after, differed, same, polarity, letters }: Props) {
  const now = useNow();
  const head = (which: 'before' | 'after', take: typeof before) => (
    <th role="columnheader" scope="col">
      <MarkedName mark={<TakeMark which={which} />}>
        take {take.number}, {recordedWords(take.recordedAt, now)}
      </MarkedName>
    </th>
  );
  return (
    <>
      <PairTable role="table" aria-label="What differed">
        <PairColumns />
        <thead>
          <tr role="row">
            <th role="columnheader" scope="col">
              What differed
            </th>
            {head('before', before)}
            {head('after', after)}
          </tr>
        </thead>
        <tbody>
          {differed.map((row) => (
            <tr role="row" key={row.what}>
              <th role="rowheader" scope="row">
                {row.what}
              </th>
              <td role="cell">{row.before || missing}</td>
              <td role="cell">
                <b>{row.after || missing}</b>
              </td>
            </tr>
          ))}
        </tbody>
      </PairTable>
      <chakra.p fontSize="small" lineHeight="23px" marginTop="10px" textWrap="pretty">
        {[differed.length === 0 && 'Nothing was noted that differs.', same, polarity.sentence]
          .filter(Boolean)
          .join(' ')}{' '}
        <Letters letters={letters} />
      </chakra.p>
    </>
  );
}

/** Takes of one evening are told apart by the hour. */
function recordedWords(iso: string, now: Date): string {
  const words = relativeDate(iso, now);
  return /today|ago|just/.test(words) ? words : dateTime(iso);
}
