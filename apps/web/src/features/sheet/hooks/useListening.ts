import { paths, type ReportResponse } from '@thudline/contracts';
import { listeningMatchDb, type PairSpectrum } from '@thudline/dsp';
import { useMemo } from 'react';
import { matchGainsDb, mixPlan, safeGainDb } from '../../../lib/audio/mixPlan';
import { usePairPlayer } from '../../../lib/audio/usePairPlayer';
import type { NamedChoice } from './useChoice';

/** Hearing the choices of one take, matched from 1 to 8 kHz so that a change of the low end stays audible. */
export function useListening({
  report,
  spectrum,
  choices,
  chosen,
}: {
  report: ReportResponse;
  /** Not there yet, or never: the choices are then heard unmatched. */
  spectrum: PairSpectrum | undefined;
  choices: NamedChoice[];
  chosen: NamedChoice;
}) {
  const selected = Math.max(
    0,
    choices.findIndex((choice) => choice === chosen),
  );
  const matches = useMemo(
    () =>
      matchGainsDb(choices.map((choice) => (spectrum ? listeningMatchDb(spectrum, choice, choices[0]) : 0))),
    [choices, spectrum],
  );
  const plan = useMemo(() => {
    const peaks = { kick: report.kick.samplePeakDbfs ?? 0, overhead: report.overhead.samplePeakDbfs ?? 0 };
    const safeDb = safeGainDb(peaks, choices[0]?.gainDb ?? 0);
    return mixPlan(
      choices.map((choice, i) => ({ ...choice, matchDb: matches[i] })),
      safeDb,
    );
  }, [choices, matches, report]);
  const player = usePairPlayer(plan, selected);
  return {
    ...player,
    matchDb: matches[selected] ?? 0,
    playWholeTake: () => player.playTake(paths.listen(report.takeId)),
  };
}

export type Listening = ReturnType<typeof useListening>;
