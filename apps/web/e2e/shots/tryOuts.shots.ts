import { expect, test } from '@playwright/test';
import { takeFiles } from '@thudline/fixtures';
import { browserSettings } from '../harness/browserSettings';
import { wavFile } from '../harness/wavFile';
import { takeShots } from './takeShots';

test.use({ storageState: browserSettings().playerState });

test('tryouts', async ({ page }) => {
  await page.goto('/tryouts');
  await expect(page.getByRole('list', { name: 'Try-outs' })).toBeVisible();
  await takeShots(page, 'tryouts');
  await page.getByRole('link', { name: 'How high the overhead hangs' }).click();
  await expect(page.getByRole('table', { name: 'The takes, best first' })).toBeVisible();
  await takeShots(page, 'tryout');
  await page.getByRole('button', { name: 'as a table' }).click();
  await page.getByLabel('Rank by').selectOption('agreement');
  await takeShots(page, 'tryout-agreement');
  await page.getByRole('button', { name: 'shuffle and hide the heights' }).click();
  await takeShots(page, 'tryout-hidden');
});

test('new-tryout', async ({ page }) => {
  await page.goto('/tryouts/new');
  await expect(page.getByLabel('WAV files')).toBeAttached();
  await takeShots(page, 'new-tryout');
  const { kick, overhead } = takeFiles('good');
  const files = [90, 100, 110].flatMap((cm) => [
    wavFile(`Kick_${cm}cm.wav`, kick),
    wavFile(`OH_${cm}cm.wav`, overhead),
  ]);
  await page.getByLabel('WAV files').setInputFiles([...files, wavFile('Kick_120cm.wav', kick)]);
  await expect(page.getByRole('heading', { name: /pairs are here/ })).toBeVisible();
  await takeShots(page, 'new-tryout-pairs');
});
