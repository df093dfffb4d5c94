import { expect, test } from '@playwright/test';
import { expectAccessibleInBothThemes } from './harness/accessibility';

test('a guest finds the way to join, and a wrong password is refused where it stands', async ({ page }) => {
  await page.goto('/');
  await expectAccessibleInBothThemes(page, 'first page');
  await page.goto('/sign-in');
  await expectAccessibleInBothThemes(page, 'sign in');
  await page.goto('/join');
  await expect(page).toHaveTitle(/thudline/i);
  await expectAccessibleInBothThemes(page, 'join');
});
