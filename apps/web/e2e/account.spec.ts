import { readFile } from 'node:fs/promises';
import { expect, test } from '@playwright/test';
import { takeFiles } from '@thudline/fixtures';
import { linkFromMail } from './harness/mailSink';
import { joinAsNewcomer } from './harness/newcomer';
import { expectReadable } from './harness/readable';
import { uploadTake, waitForSheet } from './harness/uploadTake';
import { zipNames } from './harness/zipNames';

test('a newcomer records, takes everything along in one archive, changes the address, and leaves', async ({
  page,
}) => {
  const { email, password } = await joinAsNewcomer(page, 'Tove');
  await page.goto('/takes/new');
  await uploadTake(page, 'hot-kick-opposite-overhead');
  await waitForSheet(page);
  await page.goto('/settings');
  await expect(page.getByText('this one, now')).toBeVisible();
  await expectReadable(page, 'settings');

  await page.getByRole('button', { name: 'Export everything' }).click();
  await page.reload();
  const link = page.getByRole('link', { name: /^thudline .*\.zip$/ });
  await expect(link).toBeVisible({ timeout: 60_000 });
  const [download] = await Promise.all([page.waitForEvent('download'), link.click()]);
  const archive = await readFile(await download.path());
  const names = zipNames(archive);
  expect(names).toEqual(
    expect.arrayContaining(['read me.txt', 'account.json', 'takes.csv', 'data/take.json']),
  );
  const recordings = names.filter((name) => name.endsWith('.wav'));
  expect(recordings.map((name) => name.split('/').at(-1)).sort()).toEqual(['kick in.wav', 'oh.wav']);
  expect(names.some((name) => name.endsWith('/report.json'))).toBe(true);
  const { kick } = takeFiles('hot-kick-opposite-overhead');
  expect(archive.includes(Buffer.from(kick))).toBe(true);

  await page.getByRole('button', { name: 'change the e-mail address' }).click();
  const other = `new-${email}`;
  await page.getByRole('textbox', { name: 'E-mail' }).fill(other);
  await page.getByLabel('Your password').fill(password);
  await expectReadable(page, 'settings, another address');
  await page.getByRole('button', { name: 'Send the mail' }).click();
  await expect(page.getByText('Your address changes when you open its link')).toBeVisible();
  await page.goto(await linkFromMail(other, 'new-address'));
  await expect(page.getByRole('heading', { name: /^Your address is the new one/ })).toBeVisible();
  await expectReadable(page, 'another address confirmed');

  await page.goto('/settings');
  await expect(page.getByText(other)).toBeVisible();
  await page.getByRole('button', { name: 'Delete the account' }).click();
  await page.getByRole('dialog').getByLabel('Your password').fill(password);
  await expectReadable(page, 'delete the account?');
  await page.getByRole('button', { name: 'Delete it in 7 days' }).click();
  await expect(page.getByText(/^This account goes on/)).toBeVisible();
  await page.goto('/takes');
  await expect(page.getByText(/^This account goes on/)).toBeVisible();
  await expectReadable(page, 'takes of an account that goes');
  await page.getByRole('button', { name: 'Keep the account' }).click();
  await expect(page.getByText(/^This account goes on/)).toBeHidden();
});
