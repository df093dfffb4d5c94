import { execFileSync } from 'node:child_process';
import { resolve } from 'node:path';
import { expect, test } from '@playwright/test';
import { joinAsNewcomer } from './harness/newcomer';
import { expectReadable } from './harness/readable';

const makeAdmin = resolve(import.meta.dirname, '../../api/dist/make-admin.js');

test('whoever is made an admin by the command sees every account, and locks one; nobody else has the page', async ({
  page,
  browser,
}) => {
  const { email } = await joinAsNewcomer(page, 'Ada');
  await page.goto('/admin');
  await expect(page.getByRole('heading', { name: /Accounts/ })).toBeHidden();
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  execFileSync(process.execPath, [makeAdmin, email], { env: adminEnvironment() });
  await page.reload();
  await expect(page.getByRole('heading', { name: 'Accounts', exact: true })).toBeVisible();

  const other = await browser.newContext();
  const otherPage = await other.newPage();
  const mika = await joinAsNewcomer(otherPage, 'Mika');
  await page.getByLabel('Find by name or address').fill(mika.email);
  await page.getByRole('button', { name: `change Mika, ${mika.email}` }).click();
  await expectReadable(page, 'admin');
  await page.getByRole('button', { name: 'Lock' }).click();
  await expect(page.getByText('locked', { exact: true })).toBeVisible();
  await expect(page.getByText('Ada locked Mika')).toBeVisible();
  await otherPage.goto('/settings');
  await expect(otherPage).toHaveURL(/\/sign-in/);
  await other.close();
});

/** The database is all it asks. */
function adminEnvironment(): NodeJS.ProcessEnv {
  return {
    ...process.env,
    DATABASE_URL: process.env.BROWSER_DATABASE_URL,
    PUBLIC_URL: 'http://127.0.0.1',
  };
}
