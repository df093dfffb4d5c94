import { expect, test } from '@playwright/test';
import { joinAsNewcomer } from './harness/newcomer';
import { expectReadable } from './harness/readable';
import { uploadTake, waitForSheet } from './harness/uploadTake';

test('the next take after a tick says what became of it, and Big print goes on to it', async ({
  page,
  context,
}) => {
  await joinAsNewcomer(page, 'Tilo');
  await page.goto('/takes/new');
  await uploadTake(page, 'hot-kick-opposite-overhead');
  await waitForSheet(page);
  const takeUrl = page.url();
  await page.getByRole('checkbox', { name: /polarity switch/ }).check();
  await page.getByRole('checkbox', { name: /Turn the kick preamp down/ }).check();

  const bigPrint = await context.newPage();
  await bigPrint.goto(`${takeUrl}/big`);
  await expect(bigPrint.getByText(/polarity switch/).first()).toBeVisible();
  await expectReadable(bigPrint, 'big print');

  await page.getByRole('link', { name: 'Add the next take' }).click();
  await expect(page.getByRole('heading', { name: 'What you changed since take 1' })).toBeVisible();
  await expect(page.getByRole('checkbox', { name: /polarity switch/ })).toBeChecked();
  await expectReadable(page, 'next take');
  await uploadTake(page, 'flipped-kick-down');
  await waitForSheet(page);

  const outcomes = page.getByRole('region', { name: /^Since take 1/ });
  await expect(outcomes.getByText(/^The flip worked:/)).toBeVisible();
  await expect(outcomes.getByRole('listitem')).toHaveCount(2);
  await expect(page.getByRole('heading', { level: 1 })).toContainText('The flip worked');
  await expectReadable(page, 'sheet of the take after');
  await expect(bigPrint).toHaveURL(new RegExp(`${new URL(page.url()).pathname}/big$`));
});
