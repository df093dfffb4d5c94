import { usePageKeys } from '../../sheet/hooks/usePageKeys';
import type { TwoTakes } from './useTwoTakes';

interface CompareKeys {
  singleKeys: boolean;
  /** Null where nothing may be heard. */
  listening: TwoTakes | null;
  playFromHit: () => void;
  stepHit: (by: 1 | -1) => boolean;
  onHelp: () => void;
}

/** What every single key of a comparison does, for the list of keys. */
export const compareKeyWords: [keys: string, does: string][] = [
  ['Space or 0', 'play both takes from the chosen hit, and stop them'],
  ['1', 'hear the take before, at the same moment'],
  ['2', 'hear the take after'],
  ['← →', 'the hit before, the hit after'],
  ['?', 'this list'],
  ['+ − 0', 'in the traces: closer, wider, as it was; Shift with the arrows moves them'],
];

/** Single keys of a comparison; they can be switched off (WCAG 2.1.4). */
export function useCompareKeys(keys: CompareKeys) {
  usePageKeys(keys.singleKeys, (key) => act(key, keys));
}

/** @returns whether the key meant something */
function act(key: string, { listening, playFromHit, stepHit, onHelp }: CompareKeys): boolean {
  if (key === '?') {
    onHelp();
    return true;
  }
  if (key === 'ArrowRight' || key === 'ArrowLeft') return stepHit(key === 'ArrowRight' ? 1 : -1);
  if (!listening) return false;
  if (key === ' ' || key === '0') {
    if (listening.state === 'stopped') playFromHit();
    else listening.stop();
    return true;
  }
  if (key !== '1' && key !== '2') return false;
  listening.choose(key === '1' ? 0 : 1);
  return true;
}
