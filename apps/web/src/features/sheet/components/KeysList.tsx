import { Fragment } from 'react';
import { chakra } from '@chakra-ui/react';
import { sheetKeyWords } from '../hooks/useSheetKeys';

/** Every key of a sheet and what it does. */
export function KeysList() {
  return (
    <chakra.dl display="grid" gridTemplateColumns="auto 1fr" columnGap="22px" rowGap="8px" marginTop="14px">
      {sheetKeyWords.map(([keys, does]) => (
        <Fragment key={keys}>
          <chakra.dt fontWeight={600} whiteSpace="nowrap">
            {keys}
          </chakra.dt>
          <dd>{does}</dd>
        </Fragment>
      ))}
    </chakra.dl>
  );
}
