import { expect, test } from '@playwright/test';
import { getDemoTake, starTitle } from './harness/apiSession';
import { browserSettings } from './harness/browserSettings';

test.use({ storageState: browserSettings().playerState, colorScheme: 'dark' });

/** One object of this type stands in the file for each page (ISO 32000-1, 7.7.3.3). */
const pageObject = /\/Type\s*\/Page\b(?!s)/g;

test('a sheet fits two pages of A4 and of Letter, light even where the screen is dark', async ({ page }) => {
  const { id } = await getDemoTake(starTitle);
  await page.goto(`/takes/${id}`);
  await expect(page.getByRole('img', { name: /^Low end of the two added/ })).toBeVisible();
  await expect(page.locator('[role=status][aria-label^=Loading]')).toHaveCount(0);
  for (const format of ['A4', 'Letter']) {
    const pdf = await page.pdf({ format });
    expect(pdf.toString('latin1').match(pageObject), format).toHaveLength(2);
  }
  await page.emulateMedia({ media: 'print' });
  await expect(page.locator('html')).not.toHaveClass(/dark/);
  await expect(page.getByRole('button', { name: 'Send this sheet' })).toBeHidden();
});
