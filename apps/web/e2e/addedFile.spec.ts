import { readFile } from 'node:fs/promises';
import { expect, test } from '@playwright/test';
import { bytesSource, openWav } from '@thudline/dsp';
import { getDemoTake, starTitle } from './harness/apiSession';
import { browserSettings } from './harness/browserSettings';
import { expectReadable } from './harness/readable';

test.use({ storageState: browserSettings().playerState });

test('the two become one file with the choice on the sheet, which is kept and heard', async ({ page }) => {
  const { id, number } = await getDemoTake(starTitle);
  await page.goto(`/takes/${id}`);
  const section = page.getByRole('region', { name: 'One file of the two' });
  const makeOne = section.getByRole('button', { name: 'Make one file of the two' });
  await page.getByLabel('Overhead earlier, ms').fill('1.5');
  await page.getByLabel('Polarity of the overhead').selectOption('not flipped');
  await expect(section.getByText(/Kick and overhead not flipped, 1\.50 ms earlier/)).toBeVisible();
  await makeOne.click();

  const link = section.getByRole('link', { name: new RegExp(`^take-${number}-added-1\\.5-ms-earlier`) });
  await expect(link).toBeVisible({ timeout: 60_000 });
  await expect(makeOne).toBeDisabled();
  await expectReadable(page, 'sheet with an added file');

  const [download] = await Promise.all([page.waitForEvent('download'), link.click()]);
  const { facts } = await openWav(bytesSource(await readFile(await download.path())));
  expect(facts).toMatchObject({ encodingName: '24-bit PCM', channels: 1 });
  expect(facts.broadcast?.description).toContain('overhead not flipped, 1.500 ms earlier');

  await page.reload();
  await expect(link).toBeVisible();
  const heard = page.waitForResponse((answer) => answer.url().endsWith('/listen.wav'));
  await section.getByRole('button', { name: /^Hear it/ }).click();
  expect([200, 206]).toContain((await heard).status());
  await section.getByRole('button', { name: /^Stop/ }).click();
  await section.getByRole('button', { name: /^Remove/ }).click();
  await expect(link).toBeHidden();
  await expect(makeOne).toBeVisible();
});
