import { usePageKeys } from '../../sheet/hooks/usePageKeys';
import type { HearAll } from './useHearAll';

/** What every single key of a try-out does, for the list of keys. */
export const tryOutKeyWords: [keys: string, does: string][] = [
  ['Space', 'play all takes in step, and stop them'],
  ['1 2 3 …', 'hear that take, from left to right, at the same moment'],
  ['← →', 'the take before, the take after'],
  ['?', 'this list'],
];

interface HearKeys {
  singleKeys: boolean;
  hearing: HearAll;
  /** As they stand on the page, from left to right. */
  placeIds: readonly string[];
  onHelp: () => void;
}

/** Single keys of a try-out; they can be switched off (WCAG 2.1.4). */
export function useHearKeys(keys: HearKeys) {
  usePageKeys(keys.singleKeys, (key) => act(key, keys));
}

/** @returns whether the key meant something */
function act(key: string, { hearing, placeIds, onHelp }: HearKeys): boolean {
  if (key === '?') {
    onHelp();
    return true;
  }
  if (placeIds.length === 0) return false;
  if (key === ' ') {
    if (hearing.state === 'stopped') hearing.play();
    else hearing.stop();
    return true;
  }
  const walk = key === 'ArrowRight' ? 1 : key === 'ArrowLeft' ? -1 : 0;
  const next =
    walk !== 0
      ? placeIds[placeIds.indexOf(hearing.heardId ?? '') + walk]
      : /^[1-9]$/.test(key)
        ? placeIds[Number(key) - 1]
        : undefined;
  if (next === undefined) return false;
  hearing.choose(next);
  return true;
}
