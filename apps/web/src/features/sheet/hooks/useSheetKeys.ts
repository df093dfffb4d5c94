import type { Excerpt } from './useExcerpt';
import type { Bench } from './useChoice';
import type { Listening } from './useListening';
import { usePageKeys } from './usePageKeys';

interface SheetKeys {
  singleKeys: boolean;
  bench: Bench;
  listening: Listening;
  excerpt: Excerpt | undefined;
  kickHits: number[];
  chosenHit: number;
  onChooseHit: (hitIndex: number) => void;
  onHelp: () => void;
}

/** What every single key of the sheet does, for the list of keys. */
export const sheetKeyWords: [keys: string, does: string][] = [
  ['Space', 'play the hit on repeat, and stop it'],
  ['1 2 3 …', 'the choices, from left to right'],
  ['← →', 'the hit before, the hit after'],
  ['N', 'write a note'],
  ['?', 'this list'],
  ['+ − 0', 'in the pair trace: closer, wider, as it was; Shift with the arrows moves it'],
  ['↑ ↓', 'in a number of the choice: more, less'],
];

/** Single keys of the sheet; they can be switched off (WCAG 2.1.4). */
export function useSheetKeys(keys: SheetKeys) {
  usePageKeys(keys.singleKeys, (key) => act(key, keys));
}

/** @returns whether the key meant something */
function act(
  key: string,
  { bench, listening, excerpt, kickHits, chosenHit, onChooseHit, onHelp }: SheetKeys,
): boolean {
  if (key === '?') {
    onHelp();
    return true;
  }
  if (key === ' ') {
    if (listening.playing !== 'nothing') listening.stop();
    else if (excerpt) void listening.playHit(excerpt);
    else return false;
    return true;
  }
  const walk = key === 'ArrowRight' ? 1 : key === 'ArrowLeft' ? -1 : 0;
  if (walk !== 0) {
    const next = kickHits[kickHits.indexOf(chosenHit) + walk];
    if (next !== undefined) onChooseHit(next);
    return next !== undefined;
  }
  const choice = /^[1-9]$/.test(key) ? bench.named[Number(key) - 1] : undefined;
  if (choice) bench.set({ flipped: choice.flipped, shiftMs: choice.shiftMs });
  return choice !== undefined;
}
