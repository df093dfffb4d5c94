import { execFileSync } from 'node:child_process';
import { resolve } from 'node:path';
import { expect, test } from '@playwright/test';
import { joinAsNewcomer } from '../harness/newcomer';
import { takeShots } from './takeShots';

test('admin', async ({ page }) => {
  const { email } = await joinAsNewcomer(page, 'Ada');
  const command = resolve(import.meta.dirname, '../../../api/dist/make-admin.js');
  const { BROWSER_DATABASE_URL: url } = process.env;
  execFileSync(process.execPath, [command, email], {
    env: { ...process.env, DATABASE_URL: url, PUBLIC_URL: 'http://127.0.0.1' },
  });
  await page.goto('/admin');
  await expect(page.getByRole('table', { name: 'Accounts' })).toBeVisible();
  await takeShots(page, 'admin');
});
