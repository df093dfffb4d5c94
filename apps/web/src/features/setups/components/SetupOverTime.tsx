import { paths, type SetupResponse } from '@thudline/contracts';
import { lazy, Suspense } from 'react';

const Trend = lazy(() => import('../../rooms/components/Trend').then((part) => ({ default: part.Trend })));

/** A figure of the takes recorded with a setup, over time; nothing to see before there are two. */
export function SetupOverTime({ setup }: { setup: SetupResponse }) {
  if (setup.takeCount < 2) return null;
  return (
    <Suspense fallback={null}>
      <Trend path={paths.setupTrend(setup.id)} of="setup" first="arrival" />
    </Suspense>
  );
}
