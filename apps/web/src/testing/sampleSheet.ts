import { paths, type TakeResponse } from '@thudline/contracts';
import { json, type FakeRoutes } from './fakeServer';
import { sampleNotes } from './sampleNotes';
import { sampleExcerpt, samplePairSpectrumBytes, sampleReport, sampleTake, takeId } from './sampleData';

/** Everything a sheet asks for, answered for one measured take. */
export function servedSheet(take: Partial<TakeResponse> = {}): FakeRoutes {
  const report = sampleReport();
  return {
    [`GET ${paths.take(takeId)}`]: json(sampleTake(take)),
    [`GET ${paths.report(takeId)}`]: json(report),
    [`GET ${paths.pairSpectrum(takeId)}`]: () => ({ bytes: samplePairSpectrumBytes(report.pairSpectrum!) }),
    [`GET ${paths.excerpt(takeId)}`]: () => sampleExcerpt(),
    [`GET ${paths.notes(takeId)}`]: json(sampleNotes([], { mayNote: false, isOwn: false, needsName: true })),
  };
}
