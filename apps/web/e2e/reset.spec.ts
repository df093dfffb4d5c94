import { expect, test } from '@playwright/test';
import { linkFromMail } from './harness/mailSink';
import { joinAsNewcomer } from './harness/newcomer';
import { expectReadable } from './harness/readable';

test('an address is confirmed, a forgotten password is set anew from a mail, and the old one is gone', async ({
  page,
}) => {
  const { name, email, password } = await joinAsNewcomer(page, 'Runa');
  await page.goto(await linkFromMail(email, 'verify'));
  await expect(page.getByRole('heading', { name: /Your address is right/ }).first()).toBeVisible();
  await expectReadable(page, 'address confirmed');
  await page.goto('/takes');
  await page.getByRole('button', { name }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();

  await page.getByRole('link', { name: 'Forgot the password?' }).click();
  await expectReadable(page, 'forgot');
  await page.getByLabel('E-mail').fill(email);
  await page.getByRole('button', { name: 'Send the link' }).click();
  await expect(page.getByText('a mail is on its way')).toBeVisible();
  const link = await linkFromMail(email, 'reset');
  await page.goto(link);
  await expectReadable(page, 'new password');
  await page.getByRole('textbox', { name: 'New password' }).fill('a-louder-kit-8');
  await page.getByRole('button', { name: 'Set it' }).click();
  await page.getByRole('link', { name: 'Sign in' }).last().click();

  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert').first()).toBeVisible();
  await expectReadable(page, 'sign in, refused');
  await page.getByLabel('Password', { exact: true }).fill('a-louder-kit-8');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(/\/takes/);

  await page.goto(link);
  await page.getByRole('textbox', { name: 'New password' }).fill('a-third-kit-99');
  await page.getByRole('button', { name: 'Set it' }).click();
  await expect(page.getByRole('link', { name: 'Send a new link' })).toBeVisible();
});
