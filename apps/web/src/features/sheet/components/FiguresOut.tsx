import { Flex, chakra } from '@chakra-ui/react';
import type { ReportResponse, TakeResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { keepFile } from '../../../lib/keepFile';
import { figuresCsv, figuresFileName, figuresJson, figuresText } from '../figuresFile';
import type { FigureGroup } from './figureRows';

/** All figures to copy or to keep as a file. */
export function FiguresOut({
  take,
  report,
  groups,
}: {
  take: TakeResponse;
  report: ReportResponse;
  groups: FigureGroup[];
}) {
  const [said, setSaid] = useState('');
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(figuresText(groups));
      setSaid('Copied.');
    } catch {
      setSaid('This browser does not let the page copy. Take the CSV instead.');
    }
  };
  return (
    <Flex gap="18px" fontSize="small" marginTop="10px" wrap="wrap" _print={{ display: 'none' }}>
      <TextButton onClick={() => void copy()}>copy them</TextButton>
      <TextButton onClick={() => keepFile(figuresFileName(take, 'csv'), figuresCsv(groups), 'text/csv')}>
        as CSV
      </TextButton>
      <TextButton
        onClick={() => keepFile(figuresFileName(take, 'json'), figuresJson(report), 'application/json')}
      >
        as JSON
      </TextButton>
      <chakra.span role="status" color="ink.muted">
        {said}
      </chakra.span>
    </Flex>
  );
}
