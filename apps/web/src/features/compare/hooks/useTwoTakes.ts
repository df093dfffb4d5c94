import type { ReportResponse } from '@thudline/contracts';
import { useMemo, useState } from 'react';
import { useTakesPlayer } from '../../../lib/audio/useTakesPlayer';
import { loadTakeSound } from '../../sheet/takeSound';
import { commonTime, heardStretch } from '../commonTime';

/** Which of the two is heard: the take before or the take after. */
export type Heard = 0 | 1;

/** Hearing two takes in step, equally loud, with a switch between them; long ones are loaded stretch by stretch. */
export function useTwoTakes(reports: readonly [ReportResponse, ReportResponse]) {
  const [heard, setHeard] = useState<Heard>(1);
  const time = useMemo(() => commonTime(reports), [reports]);
  const load = async (fromS: number, signal: AbortSignal) => {
    const { stretches, ...stretch } = heardStretch(time, fromS);
    const sounds = await Promise.all(
      reports.map(({ takeId }, i) => loadTakeSound({ takeId, ...stretches[i] }, signal)),
    );
    const takes = sounds.map((sound, i) => ({
      sound,
      overheadGainDb: reports[i].agreement.matchGainDb ?? 0,
    }));
    return { takes, ...stretch };
  };
  const player = useTakesPlayer({
    key: reports.map(({ takeId }) => takeId).join(' '),
    load,
    selected: heard,
  });
  return { ...player, time, heard, choose: setHeard };
}

export type TwoTakes = ReturnType<typeof useTwoTakes>;
