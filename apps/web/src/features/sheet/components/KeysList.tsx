import { Fragment } from 'react';
import { chakra } from '@chakra-ui/react';
import { sheetKeyWords } from '../hooks/useSheetKeys';

export type KeyWords = readonly (readonly [keys: string, does: string])[];

/** Every key of a page, a sheet's unless others are given, and what it does. */
export function KeysList({ keys: words = sheetKeyWords }: { keys?: KeyWords }) {
  return (
    <chakra.dl display="grid" gridTemplateColumns="auto 1fr" columnGap="22px" rowGap="8px" marginTop="14px">
      {words.map(([keys, does]) => (
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
