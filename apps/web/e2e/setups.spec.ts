import { expect, test } from '@playwright/test';
import { browserSettings } from './harness/browserSettings';
import { expectReadable } from './harness/readable';

test.use({ storageState: browserSettings().playerState });

/** Of the demo: high above the snare, and measured. */
const high = 'one overhead, high';

test('a setup says whether tape and sound agree, and is copied with changes', async ({ page }) => {
  await page.goto('/takes');
  await page.getByRole('link', { name: 'Setups' }).click();
  await expect(page.getByRole('list', { name: 'Setups' })).toBeVisible();
  await expectReadable(page, 'setups');

  await page.getByRole('link', { name: high }).click();
  const headline = page.getByRole('heading', { level: 1 });
  await expect(headline).toContainText('The tape and the sound agree within');
  await expect(page.getByRole('img', { name: /^take \d+ measured/ })).toBeVisible();
  await expectReadable(page, 'a setup');

  await page.getByLabel('Above the snare').fill('170');
  await expect(headline).toContainText('apart');
  await page.getByRole('button', { name: 'Copy with changes' }).click();
  await expect(page.getByLabel('Above the snare')).toHaveValue('170');
  await page.getByLabel('Name').fill('higher still');
  await expectReadable(page, 'a new setup');
  await page.getByRole('button', { name: 'Keep this setup' }).click();
  await expect(page).toHaveURL(/\/setups\/[0-9a-f-]{36}$/);
  await expect(page.getByText('no take has it yet')).toBeVisible();

  await page.reload();
  await expect(page.getByLabel('Above the snare')).toHaveValue('170');
  await page.getByRole('button', { name: 'Remove it' }).click();
  await expect(page).toHaveURL(/\/setups$/);
  await expect(page.getByRole('link', { name: 'higher still' })).toHaveCount(0);
});

test('takes are found by their setup, and a take’s sheet leads to it', async ({ page }) => {
  await page.goto('/takes');
  await page.getByLabel('With setup').selectOption({ label: high });
  const table = page.getByRole('table', { name: 'Takes' });
  await expect(table.getByRole('checkbox')).toHaveCount(1);
  await table.getByRole('link').first().click();
  await expect(page.getByRole('heading', { name: 'All figures' })).toBeVisible();
  await page.getByRole('link', { name: high }).click();
  await expect(page.getByLabel('Name')).toHaveValue(high);
});
