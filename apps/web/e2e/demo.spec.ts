import { expect, test } from '@playwright/test';
import { browserSettings } from './harness/browserSettings';

test.use({ storageState: browserSettings().playerState });

test('the demo player finds two measured takes, and deletes one only after a second thought', async ({
  page,
}) => {
  await page.goto('/takes');
  const rows = page
    .getByRole('table', { name: 'Takes' })
    .getByRole('row')
    .filter({ has: page.getByRole('link') });
  await expect(rows).toHaveCount(2);
  await expect(rows.filter({ hasText: 'Loud chorus' })).toContainText('Flip the overhead');
  await rows
    .first()
    .getByRole('button', { name: /^delete take/ })
    .click();
  await page.getByRole('button', { name: 'Keep it' }).click();
  await expect(rows).toHaveCount(2);
  await rows
    .first()
    .getByRole('button', { name: /^delete take/ })
    .click();
  await page.getByRole('button', { name: 'Delete it' }).click();
  await expect(rows).toHaveCount(1);
  await page.reload();
  await expect(rows).toHaveCount(1);
});
