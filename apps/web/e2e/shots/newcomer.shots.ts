import { expect, test } from '@playwright/test';
import { joinAsNewcomer } from '../harness/newcomer';
import { takeShots } from './takeShots';

test('first-run', async ({ page }) => {
  await joinAsNewcomer(page);
  await page.goto('/takes');
  await expect(page.getByRole('heading', { name: /Your first take/ })).toBeVisible();
  await takeShots(page, 'takes-empty');
  await page.goto('/takes/new');
  await expect(page.getByRole('heading', { name: 'The check take' })).toBeVisible();
  await takeShots(page, 'first-run');
});
