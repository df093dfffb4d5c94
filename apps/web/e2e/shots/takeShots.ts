import { mkdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { expect, type Page } from '@playwright/test';

/** Ignored by git. */
export const shotsDir = resolve(import.meta.dirname, '../../../../shots');

const desk = { width: 1280, height: 800 };
const phone = { width: 390, height: 844 };

/** Pictures of a page as it stands (whole, or what the window shows where a dialog is open), in both themes, at the desk and on a phone: `<name>-<width>-<theme>.png`. */
export async function takeShots(page: Page, name: string, { fullPage = true } = {}): Promise<void> {
  mkdirSync(shotsDir, { recursive: true });
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    for (const size of [desk, phone]) {
      await page.setViewportSize(size);
      await settle(page);
      await page.screenshot({
        path: `${shotsDir}/${name}-${size.width}-${colorScheme}.png`,
        fullPage,
        animations: 'disabled',
      });
    }
  }
  await page.setViewportSize(desk);
}

/** Everything that loads later has come, and the fonts. */
export async function settle(page: Page): Promise<void> {
  await expect(page.locator('[role=status][aria-label^=Loading]')).toHaveCount(0);
  await page.evaluate(() => document.fonts.ready.then(() => undefined));
}
