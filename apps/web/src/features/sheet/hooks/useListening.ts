import { paths, type ReportResponse } from '@thudline/contracts';
import { listeningMatchDb, type PairSpectrum } from '@thudline/dsp';
import { useMemo } from 'react';
import { keepSession } from '../../../lib/apiClient';
import { decibels } from '../../../lib/format';
import { matchGainsDb, mixPlan, safeGainDb } from '../../../lib/audio/mixPlan';
import { usePairPlayer } from '../../../lib/audio/usePairPlayer';
import type { NamedChoice } from './choiceNames';
import type { Bench } from './useChoice';

/** Hearing the choices of one take, matched from 1 to 8 kHz so that a change of the low end stays audible. */
export function useListening({
  report,
  spectrum,
  bench: { named, chosen },
}: {
  report: ReportResponse;
  /** Not there yet, or never: the choices are then heard unmatched. */
  spectrum: PairSpectrum | undefined;
  bench: Bench;
}) {
  // The last place is the player's own choice, whether it has a name or not: the number of mixes never changes.
  const heard = useMemo(() => [...named, chosen], [named, chosen]);
  const selected = heard.indexOf(chosen);
  const matches = useMemo(
    () => matchGainsDb(heard.map((choice) => (spectrum ? listeningMatchDb(spectrum, choice, heard[0]) : 0))),
    [heard, spectrum],
  );
  const plan = useMemo(() => {
    const peaks = { kick: report.kick.samplePeakDbfs ?? 0, overhead: report.overhead.samplePeakDbfs ?? 0 };
    const safeDb = safeGainDb(peaks, chosen.gainDb);
    return mixPlan(
      heard.map((choice, i) => ({ ...choice, matchDb: matches[i] })),
      safeDb,
    );
  }, [heard, matches, report, chosen.gainDb]);
  const player = usePairPlayer({
    takeUrl: paths.listen(report.takeId),
    beforeTake: keepSession,
    plan,
    selected,
  });
  return {
    ...player,
    matchDb: matches[selected] ?? 0,
    /** What differs from the files as they are; nothing is changed without saying so. */
    heardWords: heardWords(chosen),
  };
}

function heardWords({ label, gainDb }: NamedChoice): string {
  const gain =
    Math.abs(gainDb) < 0.05
      ? ''
      : `overhead ${decibels(Math.abs(gainDb))} ${gainDb > 0 ? 'louder' : 'quieter'}`;
  return [label, gain].filter(Boolean).join(', ');
}

export type Listening = ReturnType<typeof useListening>;
