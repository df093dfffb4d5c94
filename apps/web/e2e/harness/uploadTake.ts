import { expect, type Page } from '@playwright/test';
import { takeFiles } from '@thudline/fixtures';
import { wavFile } from './wavFile';

/** From the page of a new take, already open: sends a synthetic take and ends on its sheet, measured or not. */
export async function uploadTake(page: Page, scenario: string): Promise<void> {
  const { kick, overhead } = takeFiles(scenario);
  await page
    .getByLabel('WAV files')
    .setInputFiles([wavFile('kick in.wav', kick), wavFile('oh.wav', overhead)]);
  await expect(
    page.getByRole('group', { name: 'Microphone of oh.wav' }).getByLabel('overhead'),
  ).toBeChecked();
  await page.getByRole('button', { name: 'Measure this take' }).click();
  await expect(page).toHaveURL(/\/takes\/[0-9a-f-]{36}$/);
}

/** Waits for the sheet of the take whose page is open. */
export async function waitForSheet(page: Page): Promise<void> {
  await expect(page.getByRole('heading', { name: 'All figures' })).toBeVisible({ timeout: 90_000 });
}
