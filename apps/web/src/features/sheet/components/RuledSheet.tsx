import { Box } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const marginPx = 328;
/** The sheet as it stands at the desk, on the width of A4 less its margins: 1,088 px on 186 mm, so that it fits two pages. */
const onPaper = { zoom: 0.64, columns: '704px 328px', gapPx: 56 };

/** The sheet's paper: a margin line down its whole length, with rows of body and margin. */
export function RuledSheet({ children }: { children: ReactNode }) {
  return (
    <Box
      as="article"
      bg="sheet"
      borderBottom="1px solid"
      borderColor="rule"
      position="relative"
      paddingTop={{ base: '22px', lg: '25px' }}
      paddingBottom="44px"
      _print={{ padding: '22px 0 0', border: 'none', zoom: onPaper.zoom, width: '1088px' }}
    >
      <Box
        aria-hidden
        display={{ base: 'none', lg: 'block' }}
        position="absolute"
        top="0"
        bottom="0"
        right={`${marginPx}px`}
        borderLeft="1px solid"
        borderColor="margin"
        _print={{ display: 'block' }}
      />
      {children}
    </Box>
  );
}

/** A stretch of the sheet and what stands in the margin beside it; on a phone the note folds under it. */
export function SheetRow({ children, note }: { children: ReactNode; note?: ReactNode }) {
  return (
    <Box
      display={{ base: 'block', lg: 'grid' }}
      gridTemplateColumns={`minmax(0, 1fr) ${marginPx}px`}
      _print={{ display: 'grid', gridTemplateColumns: onPaper.columns, columnGap: `${onPaper.gapPx}px` }}
    >
      <Box
        paddingLeft={{ base: '18px', md: '40px', lg: '64px' }}
        paddingRight={{ base: '18px', md: '40px', lg: '56px' }}
        minWidth={0}
        _print={{ padding: 0 }}
      >
        {children}
      </Box>
      {note && (
        <Box
          paddingLeft={{ base: '18px', md: '40px', lg: 0 }}
          paddingRight={{ base: '18px', md: '40px', lg: '20px' }}
          display="flex"
          flexDirection="column"
          gap="12px"
          marginTop={{ base: '14px', lg: 0 }}
          minWidth={0}
          _print={{ padding: 0, marginTop: 0 }}
          // Nothing to say, and no note yet in the place kept for them.
          css={{ '&:not(:has(> :not(:empty)))': { display: 'none' } }}
        >
          {note}
        </Box>
      )}
    </Box>
  );
}

/** A remark in the margin, joined to the margin line by a hairline. */
export function MarginNote({ from, about, children }: { from: string; about?: string; children: ReactNode }) {
  return (
    <Box
      as="aside"
      aria-label={`${from}${about ? `, ${about}` : ''}`}
      position="relative"
      fontSize="small"
      lineHeight="21px"
      paddingLeft={{ base: '14px', lg: '20px' }}
      borderLeft={{ base: '1px solid', lg: 'none' }}
      borderColor={{ base: 'margin' }}
      _print={{ paddingLeft: '20px', borderLeft: 'none' }}
      _before={{
        content: '""',
        display: { base: 'none', lg: 'block', _print: 'block' },
        position: 'absolute',
        left: '-1px',
        top: '10px',
        width: '13px',
        borderTop: '1px solid',
        borderColor: 'margin',
      }}
    >
      <Box fontSize="caption" color="ink.muted">
        <Box as="b" color="ink" fontWeight={600}>
          {from}
        </Box>
        {about && ` · ${about}`}
      </Box>
      {children}
    </Box>
  );
}
