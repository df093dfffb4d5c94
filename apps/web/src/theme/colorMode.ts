const storageKey = 'thudline.theme';

export const colorModes = ['system', 'light', 'dark'] as const;
export type ColorMode = (typeof colorModes)[number];

const prefersDark = () => window.matchMedia('(prefers-color-scheme: dark)');

export function storedColorMode(): ColorMode {
  const stored = localStorage.getItem(storageKey);
  return colorModes.find((mode) => mode === stored) ?? 'system';
}

function apply(mode: ColorMode) {
  const dark = mode === 'dark' || (mode === 'system' && prefersDark().matches);
  document.documentElement.classList.toggle('dark', dark);
  document.documentElement.style.colorScheme = dark ? 'dark' : 'light';
}

export function chooseColorMode(mode: ColorMode) {
  localStorage.setItem(storageKey, mode);
  apply(mode);
}

/** Puts the stored theme on the page and follows the system while nothing else was chosen. */
export function startColorMode() {
  apply(storedColorMode());
  prefersDark().addEventListener('change', () => apply(storedColorMode()));
}
