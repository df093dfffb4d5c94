const storageKey = 'thudline.theme';

export const colorModes = ['system', 'light', 'dark'] as const;
export type ColorMode = (typeof colorModes)[number];

const prefersDark = () => window.matchMedia('(prefers-color-scheme: dark)');
const onPaper = () => window.matchMedia('print');

export function storedColorMode(): ColorMode {
  const stored = localStorage.getItem(storageKey);
  return colorModes.find((mode) => mode === stored) ?? 'system';
}

function apply(mode: ColorMode) {
  const wanted = mode === 'dark' || (mode === 'system' && prefersDark().matches);
  const dark = wanted && !onPaper().matches;
  document.documentElement.classList.toggle('dark', dark);
  document.documentElement.style.colorScheme = dark ? 'dark' : 'light';
}

export function chooseColorMode(mode: ColorMode) {
  localStorage.setItem(storageKey, mode);
  apply(mode);
}

/**
 * Puts the stored theme on the page and follows the system while nothing else was chosen. On paper everything is light,
 * whichever theme the screen has.
 */
export function startColorMode() {
  apply(storedColorMode());
  for (const query of [prefersDark(), onPaper()])
    query.addEventListener('change', () => apply(storedColorMode()));
}
