import type { TakeListItem, Target } from '@thudline/contracts';
import { takeNumbers } from '../takes/chosenTakes';

type Level = 'on-target' | 'low' | 'hot' | 'clipped';

/** A take is what the worst of its two microphones is; clipped outdoes hot, hot outdoes low. Null without a hit. */
export function takeLevel(take: TakeListItem, { lowDbfs, highDbfs }: Target): Level | null {
  if (take.kickClipped || take.overheadClipped) return 'clipped';
  const peaksDbfs = [take.kickPeakDbfs, take.overheadPeakDbfs].filter((peak) => peak !== null);
  if (peaksDbfs.length === 0) return null;
  if (peaksDbfs.some((peak) => peak > highDbfs)) return 'hot';
  return peaksDbfs.some((peak) => peak < lowDbfs) ? 'low' : 'on-target';
}

export interface TargetCount {
  /** Takes with a hit to judge. */
  counted: number;
  onTarget: number;
  /** "17 of your 20 takes", heavy in the sentence. */
  strong: string;
  /** "are on target. Take 11 is low, take 14 hot, take 13 clipped." */
  rest: string;
}

/**
 * How a target fits the takes there are, in words.
 *
 * @param takes - rows of the list; those without a hit are not counted
 * @param everyTotal - of all the player's takes, which may be more than the rows
 */
export function targetCount(takes: readonly TakeListItem[], target: Target, everyTotal: number): TargetCount {
  const judged = takes.flatMap((take) => {
    const level = takeLevel(take, target);
    return level === null ? [] : [{ take, level }];
  });
  const of = (level: Level) => judged.filter((each) => each.level === level).map(({ take }) => take);
  const onTarget = of('on-target').length;
  const newest = everyTotal > takes.length ? 'newest ' : '';
  return {
    counted: judged.length,
    onTarget,
    strong: countWords(onTarget, judged.length, newest),
    rest: [
      verbWords(onTarget, judged.length),
      missWords({ low: of('low'), hot: of('hot'), clipped: of('clipped') }),
    ]
      .filter(Boolean)
      .join(' '),
  };
}

function countWords(onTarget: number, counted: number, newest: string): string {
  if (counted === 1) return 'your take';
  if (onTarget === 0) return `none of your ${newest}${counted} takes`;
  return onTarget === counted
    ? `all your ${newest}${counted} takes`
    : `${onTarget} of your ${newest}${counted} takes`;
}

function verbWords(onTarget: number, counted: number): string {
  if (counted === 1) return onTarget === 1 ? 'is on target.' : 'is not on target.';
  return onTarget <= 1 ? 'is on target.' : 'are on target.';
}

/** "Take 11 is low, takes 14 and 15 hot." The verb stands once. */
function missWords(missed: Record<'low' | 'hot' | 'clipped', TakeListItem[]>): string {
  const parts = Object.entries(missed).filter(([, takes]) => takes.length > 0);
  const words = parts.map(([level, takes], index) => {
    const verb = index > 0 ? '' : takes.length === 1 ? ' is' : ' are';
    return `${takeNumbers(takes)}${verb} ${level}`;
  });
  const sentence = words.join(', ');
  return sentence && `${sentence.charAt(0).toUpperCase()}${sentence.slice(1)}.`;
}
