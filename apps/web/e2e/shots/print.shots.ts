import { expect, test } from '@playwright/test';
import { getDemoTake, listDemoTakes, starTitle } from '../harness/apiSession';
import { browserSettings } from '../harness/browserSettings';
import { settle, shotsDir } from './takeShots';

test.use({ storageState: browserSettings().playerState });

const papers = ['A4', 'Letter'] as const;
/** Width of A4 less its margins, at 96 dots per inch. */
const paperWidthPx = 718;

test('sheets and the check take on paper', async ({ page }) => {
  test.setTimeout(300_000);
  for (const { id, number } of await listDemoTakes()) {
    await page.goto(`/takes/${id}`);
    await expect(page.getByRole('heading', { name: 'All figures' })).toBeVisible();
    await settle(page);
    for (const format of papers) {
      await page.pdf({
        path: `${shotsDir}/print-sheet-${number}-${format}.pdf`,
        format,
        preferCSSPageSize: false,
      });
    }
  }
  await page.goto('/check-take');
  await settle(page);
  for (const format of papers) await page.pdf({ path: `${shotsDir}/print-check-take-${format}.pdf`, format });
});

test('a sheet without colours', async ({ page }) => {
  const { id } = await getDemoTake(starTitle);
  await page.goto(`/takes/${id}`);
  await page.emulateMedia({ media: 'print', colorScheme: 'light' });
  await page.setViewportSize({ width: paperWidthPx, height: 1000 });
  await settle(page);
  await page.addStyleTag({ content: 'html { filter: grayscale(1) }' });
  await page.screenshot({ path: `${shotsDir}/print-sheet-grey.png`, fullPage: true });
});
