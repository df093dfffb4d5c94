import { Box } from '@chakra-ui/react';
import type { ReportResponse, TakeResponse, UserSettings } from '@thudline/contracts';
import { lazy, Suspense } from 'react';
import { SheetSection } from './SheetSection';

/** Stands at the end of the sheet: the line above reads before it is there. */
const FigureTables = lazy(async () => ({ default: (await import('./FigureTables')).FigureTables }));
const tablesHeight = '1180px';

/** All figures, at the end of the sheet. */
export function FiguresSection(props: {
  take: TakeResponse;
  report: ReportResponse;
  settings: UserSettings;
}) {
  return (
    <SheetSection id="figures" title="All figures">
      <Suspense fallback={<Box height={tablesHeight} role="status" aria-label="Loading the figures" />}>
        <FigureTables {...props} />
      </Suspense>
    </SheetSection>
  );
}
