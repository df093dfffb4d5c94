import { randomUUID } from 'node:crypto';
import { expect, type Page } from '@playwright/test';

export interface Newcomer {
  name: string;
  email: string;
  password: string;
}

/** Joins as somebody of whom there is nothing yet, and ends on their list of takes. */
export async function joinAsNewcomer(page: Page, name = 'Mika'): Promise<Newcomer> {
  const newcomer = {
    name,
    email: `${name.toLowerCase()}-${randomUUID()}@example.org`,
    password: 'a-quiet-kit-7',
  };
  await page.goto('/join');
  await page.getByLabel('Name').fill(newcomer.name);
  await page.getByLabel('E-mail').fill(newcomer.email);
  await page.getByLabel('Password', { exact: true }).fill(newcomer.password);
  await page.getByRole('button', { name: 'Join' }).click();
  await expect(page).toHaveURL(/\/takes/);
  return newcomer;
}
