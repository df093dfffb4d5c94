import { createKickCandidates } from '../../measurements/hits/kickCandidates';
import { selectKicks } from '../../measurements/hits/selectKicks';
import { createLateStart } from '../../measurements/lateStart/lateStart';
import { delayedSamples } from '../delayedSamples';
import { smallKit } from '../smallKit';
import { eachLowBand } from './lowBands';

/** Moves of the overhead's file, ms. */
export const LATE_STARTS_MS = [
  22, -30, 47, 64, 95, -140, 188, 233, 320, -470, 611, 702, 780, -905, 1010, 1130, 1290, -1370, 1420, 1480,
];

/** How far each of {@link LATE_STARTS_MS} is from what is found, ms; NaN where nothing is. */
export function lateStartErrorsMs(): number[] {
  // Kicks as uneven as a player's; the way of the sound, 2 ms, is part of what is found.
  const { kick, overhead, sampleRateHz } = smallKit({
    kicks: 10,
    everyS: 0.47,
    delayMs: 2,
    hats: true,
    swingS: 0.06,
  });
  return LATE_STARTS_MS.map((ms) => {
    const late = delayedSamples(overhead, Math.round((ms / 1000) * sampleRateHz));
    const candidates = createKickCandidates(sampleRateHz);
    const meter = createLateStart(sampleRateHz);
    eachLowBand({ kick, overhead: late, sampleRateHz }, (low) => {
      candidates.push(low);
      meter.push(low);
    });
    const found = meter.result(selectKicks(candidates.result(), sampleRateHz).length);
    return Math.abs((found?.overheadLateMs ?? NaN) - ms);
  });
}
