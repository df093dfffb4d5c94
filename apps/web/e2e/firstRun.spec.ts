import { expect, test } from '@playwright/test';
import { joinAsNewcomer } from './harness/newcomer';
import { expectReadable } from './harness/readable';

test('somebody new is told what to play, and reads and flips a sheet made earlier', async ({ page }) => {
  await joinAsNewcomer(page, 'Ilse');
  await expect(page.getByRole('heading', { name: /Your first take needs 45 seconds/ })).toBeVisible();
  await expect(page.getByRole('heading', { name: 'The check take' })).toBeVisible();
  await expectReadable(page, 'first run');
  await page.getByRole('link', { name: 'Read a sheet we made earlier' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Flip the overhead');
  await expectReadable(page, 'sample sheet');
  await expect(page.getByRole('link', { name: 'Add the next take' })).toHaveCount(0);
  const choices = page.getByRole('group', { name: 'Choice' });
  await choices.getByRole('button', { name: 'as recorded' }).click();
  await expect(page.getByRole('img', { name: /^Low end of the two added/ })).toHaveAccessibleName(
    / 0\.0 dB\.$/,
  );
});

test('a guest reads the check take, and the live sheet on the first page', async ({ page }) => {
  await page.goto('/');
  await expect(page.getByRole('link', { name: 'Read the whole sheet' })).toBeVisible();
  await expect(page.getByRole('img', { name: /^Low end of the two added/ })).toBeVisible();
  await expectReadable(page, 'first page');
  await page.getByRole('link', { name: 'The check take' }).first().click();
  await expect(page.getByRole('heading', { name: /check take/i }).first()).toBeVisible();
  await expectReadable(page, 'check take');
  await page.goto('/nowhere');
  await expect(page.getByText('There is nothing at this address.')).toBeVisible();
  await expectReadable(page, 'not found');
});
