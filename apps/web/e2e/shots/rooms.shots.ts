import { expect, test, type Page } from '@playwright/test';
import { browserSettings } from '../harness/browserSettings';
import { settle, shotsDir, takeShots } from './takeShots';

test.use({ storageState: browserSettings().playerState });

async function openGarage(page: Page): Promise<void> {
  await page.goto('/rooms');
  await page.getByRole('link', { name: 'The garage' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Four panels');
  await expect(page.getByRole('img', { name: /^decay at 500 Hz of/ })).toBeVisible();
}

test('rooms', async ({ page }) => {
  await page.goto('/rooms');
  await expect(page.getByRole('row', { name: /^The garage/ })).toBeVisible();
  await takeShots(page, 'rooms');
  await openGarage(page);
  await takeShots(page, 'room');
  await page.getByRole('button', { name: 'I changed something' }).click();
  await takeShots(page, 'room-change', { fullPage: false });
});

test('a room on paper', async ({ page }) => {
  await openGarage(page);
  await settle(page);
  for (const format of ['A4', 'Letter'] as const)
    await page.pdf({ path: `${shotsDir}/print-room-${format}.pdf`, format });
  await page.emulateMedia({ media: 'print', colorScheme: 'light' });
  await page.setViewportSize({ width: 718, height: 1000 });
  await settle(page);
  await page.addStyleTag({ content: 'html { filter: grayscale(1) }' });
  await page.screenshot({ path: `${shotsDir}/print-room-grey.png`, fullPage: true });
});
