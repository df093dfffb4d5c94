import { expect, test, type Page } from '@playwright/test';
import { takeFiles } from '@thudline/fixtures';
import { starTitle } from './harness/apiSession';
import { browserSettings } from './harness/browserSettings';
import { expectReadable } from './harness/readable';
import { wavFile } from './harness/wavFile';

test.use({ storageState: browserSettings().playerState });

const table = (page: Page) => page.getByRole('table', { name: 'Takes' });
const star = (page: Page) => table(page).getByRole('row', { name: starTitle });

test('the demo says what its takes say, and a deleted one comes back', async ({ page }) => {
  await page.goto(`/takes?find=${encodeURIComponent(starTitle)}`);
  await expect(star(page)).toContainText('Flip the overhead');
  await star(page).getByRole('checkbox').check();
  await expectReadable(page, 'a chosen take');

  await page.getByRole('button', { name: 'Delete it' }).click();
  await expect(page.getByText(/is deleted\./)).toBeVisible();
  await expect(star(page)).toHaveCount(0);
  await expectReadable(page, 'a take was deleted');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(star(page)).toBeVisible();

  await star(page).getByRole('checkbox').check();
  await page.getByRole('button', { name: 'Delete it' }).click();
  await expect(star(page)).toHaveCount(0);
  await page.goto('/takes');
  await page.getByRole('link', { name: 'restore something deleted' }).click();
  await expectReadable(page, 'deleted takes');
  await star(page)
    .getByRole('button', { name: /^restore/ })
    .click();
  await page.goto('/takes');
  await page.getByLabel(/^Find/).fill(starTitle);
  await expect(star(page)).toBeVisible();
});

test('files that were sent before are known again', async ({ page }) => {
  const { kick, overhead } = takeFiles('good');
  await page.goto('/takes/new');
  await page
    .getByLabel('WAV files')
    .setInputFiles([wavFile('kick in.wav', kick), wavFile('oh.wav', overhead)]);
  await expect(page.getByText('You sent these files before:')).toBeVisible();
  await expect(page.getByRole('button', { name: 'Measure this take' })).toBeVisible();
  await expectReadable(page, 'files sent before');
});

test('where nothing fits, wider filters are offered', async ({ page }) => {
  await page.goto('/takes?find=zebra');
  await expect(page.getByText(/0 of \d+ takes/)).toBeVisible();
  await expectReadable(page, 'nothing fits');
  await page.goto('/settings');
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expectReadable(page, 'settings');
});
