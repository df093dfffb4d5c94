import {
  measurementStages,
  type MeasurementResponse,
  type TakeListItem,
  type Target,
} from '@thudline/contracts';
import { dbfs, signedDecibels } from '../../lib/format';

const stageWords: Record<(typeof measurementStages)[number], string> = {
  fetching: 'fetching the files',
  levels: 'reading the levels',
  hits: 'finding the hits',
  arrival: 'comparing arrivals',
  'adding-up': 'adding up',
};

export const isMeasuring = ({ state }: MeasurementResponse) => state === 'queued' || state === 'running';

/** "Measuring: finding the hits, step 3 of 5". */
export function measuringWords({ state, stage }: MeasurementResponse): string {
  if (state === 'queued' || !stage) return 'Waiting to be measured';
  const step = measurementStages.indexOf(stage) + 1;
  return `Measuring: ${stageWords[stage]}, step ${step} of ${measurementStages.length}`;
}

/** What a row says that has no sheet to speak from. */
export function unmeasuredWords({ state, reason }: MeasurementResponse): { strong: string; rest: string } {
  if (state === 'cancelled') return { strong: 'Not measured:', rest: 'you stopped it.' };
  return { strong: 'Not measured:', rest: reason ?? 'something went wrong. Add the files again.' };
}

export const takeName = ({ number, title }: Pick<TakeListItem, 'number' | 'title'>) =>
  title ? `take ${number}, ${title}` : `take ${number}`;

/** The level picture in words. */
export function levelsInWords(take: TakeListItem, target: Target): string {
  const one = (name: string, peakDbfs: number | null, clipped: boolean) => {
    if (clipped) return `${name} clipped`;
    if (peakDbfs === null) return `${name} without a hit`;
    return `${name} ${dbfs(peakDbfs)}, ${placeInTarget(peakDbfs, target)}`;
  };
  return `Hardest hit: ${one('kick', take.kickPeakDbfs, take.kickClipped)}; ${one('overhead', take.overheadPeakDbfs, take.overheadClipped)}.`;
}

function placeInTarget(peakDbfs: number, { lowDbfs, highDbfs }: Target): string {
  if (peakDbfs > highDbfs) return 'above the target';
  return peakDbfs < lowDbfs ? 'below the target' : 'on target';
}

/** The low-end picture in words. */
export const lowEndInWords = (lowEndDb: number | null) =>
  lowEndDb === null
    ? 'Low end of the two added: can’t tell.'
    : `Low end of the two added: ${signedDecibels(lowEndDb)}.`;
