import { expect, test } from '@playwright/test';
import { takeShots } from './takeShots';

const pages = [
  { name: 'landing', path: '/', says: 'Join' },
  { name: 'join', path: '/join', says: 'Name' },
  { name: 'sign-in', path: '/sign-in', says: 'E-mail' },
  { name: 'forgot', path: '/forgot', says: 'E-mail' },
  { name: 'reset', path: '/reset/a-token-that-opens-nothing', says: 'password' },
  {
    name: 'verify-ended',
    path: '/verify/a-token-that-opens-nothing',
    says: 'This link has ended',
  },
  { name: 'check-take', path: '/check-take', says: 'The check take' },
  { name: 'sample', path: '/sample', says: 'Before the next take' },
  {
    name: 'phone-ended',
    path: '/phone/a-token-that-opens-nothing',
    says: 'This code doesn’t work any more.',
  },
  { name: 'share-ended', path: '/s/a-token-that-opens-nothing', says: 'This link opens no sheet' },
  { name: 'not-found', path: '/nowhere', says: 'There is nothing at this address.' },
];

for (const { name, path, says } of pages) {
  test(name, async ({ page }) => {
    await page.goto(path);
    await expect(page.getByText(says).first()).toBeVisible();
    await takeShots(page, name);
  });
}

test('sign-in-refused', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill('nobody@example.org');
  await page.getByLabel('Password', { exact: true }).fill('not-the-password');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert').first()).toBeVisible();
  await takeShots(page, 'sign-in-refused');
});
