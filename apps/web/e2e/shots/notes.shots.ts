import { expect, test } from '@playwright/test';
import { getDemoTake, starTitle } from '../harness/apiSession';
import { browserSettings } from '../harness/browserSettings';
import { linkToNote } from '../harness/noteLink';
import { takeShots } from './takeShots';

test.use({ storageState: browserSettings().playerState });

test('notes', async ({ page }) => {
  const { id } = await getDemoTake(starTitle);
  await page.goto(`/takes/${id}`);
  await expect(page.getByRole('link', { name: 'Note b, Oda' })).toBeVisible();
  const adding = page.getByRole('region', { name: /^Adding up/ });
  await adding.hover();
  await adding.getByRole('button', { name: 'Write a note here' }).click();
  await adding.getByRole('button', { name: 'Put something on your list' }).click();
  await takeShots(page, 'sheet-notes');
  const link = await linkToNote(page, id);
  await page.context().clearCookies();
  await page.goto(link);
  await page.getByRole('button', { name: 'Answer', exact: true }).click();
  await takeShots(page, 'shared-sheet-notes');
});
