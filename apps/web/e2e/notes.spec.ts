import { expect, test, type Browser, type Page } from '@playwright/test';
import { linkFromMail, mailTo } from './harness/mailSink';
import { joinAsNewcomer, type Newcomer } from './harness/newcomer';
import { linkToNote } from './harness/noteLink';
import { expectReadable } from './harness/readable';
import { uploadTake, waitForSheet } from './harness/uploadTake';

test.use({ storageState: { cookies: [], origins: [] } });

const phone = { width: 390, height: 844 };

test('a guest leaves a note on a phone, the player sees the pin, gets a mail and answers', async ({
  page,
  browser,
}) => {
  // Four readings of whole sheets by axe, each in two themes.
  test.slow();
  const player = await joinAsNewcomer(page);
  await page.goto(await linkFromMail(player.email, 'verify'));
  await expect(page.getByRole('heading', { name: /Your address is right/ }).first()).toBeVisible();
  await page.goto('/takes/new');
  await uploadTake(page, 'hot-kick-opposite-overhead');
  await waitForSheet(page);
  const guest = await openAsGuest(
    browser,
    await linkToNote(page, new URL(page.url()).pathname.split('/').at(-1)!),
  );
  await test.step('the guest writes about the loudest kick', () => writeAsGuest(guest));
  await test.step('the player sees it beside the hits and on the take', () => meetNote(page));
  await test.step('a mail says so, and leads to it', () => readMail(page, player));
  await test.step('the player answers, and the guest reads it', () => answer(page, guest));
  await test.step('what is removed can be brought back', () => removeAndUndo(page));
  await guest.context().close();
});

async function openAsGuest(browser: Browser, url: string): Promise<Page> {
  const context = await browser.newContext({ viewport: phone, storageState: { cookies: [], origins: [] } });
  const page = await context.newPage();
  await page.goto(url);
  return page;
}

async function writeAsGuest(guest: Page): Promise<void> {
  await guest.getByRole('button', { name: 'Answer', exact: true }).click();
  const box = guest.getByRole('form', { name: 'Your answer' });
  await expect(box.getByRole('textbox', { name: 'Your answer' })).toBeFocused();
  await expectReadable(guest, 'shared sheet with a box to answer');
  await guest.setViewportSize(phone);
  await box.getByLabel('What the note is about').selectOption({ label: await loudest(guest) });
  await box.getByLabel('Your name').fill('Bex');
  await box.getByRole('textbox', { name: 'Your answer' }).fill('Set the gain on **these**, the loud chorus.');
  await box.getByRole('button', { name: /^Send the answer to Mika/ }).click();
  await expect(guest.getByText(/Bex, by link/).first()).toBeVisible();
  await expect(box.getByRole('textbox', { name: 'Your answer' })).toHaveValue('');
}

async function loudest(page: Page): Promise<string> {
  const options = await page.getByLabel('What the note is about').locator('option').allTextContents();
  return options.find((words) => words.startsWith('loudest kick')) ?? '';
}

async function meetNote(page: Page): Promise<void> {
  const levels = page.getByRole('region', { name: /^Levels/ });
  await expect(levels.getByText('loud chorus')).toBeVisible();
  await expect(page.getByRole('link', { name: /^Notes 1 ?, 1 new$/ })).toBeVisible();
  await expect(page.getByRole('link', { name: 'Note a, Bex, by link' })).toBeVisible();
  const pins = page.getByRole('group', { name: 'Notes on the take' });
  await expect(pins.getByRole('button', { name: /^Play from note a, Bex/ })).toBeVisible();
  await expectReadable(page, 'sheet with a note');
  await page.goto('/takes');
  // It was on the page, so it isn't new any more.
  await expect(page.getByRole('row', { name: /1 note/ })).toBeVisible();
  await page.goBack();
}

async function readMail(page: Page, { email }: Newcomer): Promise<void> {
  const { text } = await mailTo(email, /^Bex wrote on take 1$/);
  expect(text).toContain('the loud chorus.');
  const link = /\S+#note-\S+/.exec(text)?.[0] ?? '';
  await page.goto(link);
  await expect(page.getByRole('region', { name: /^Levels/ }).getByText('loud chorus')).toBeInViewport();
}

async function answer(page: Page, guest: Page): Promise<void> {
  const levels = page.getByRole('region', { name: /^Levels/ });
  await levels.getByRole('button', { name: 'Answer' }).click();
  await levels.getByRole('textbox', { name: 'Your answer' }).fill('I will, thank you.');
  await levels.getByRole('button', { name: 'Send the answer' }).click();
  await expect(levels.getByRole('list', { name: 'Answers' }).getByText('I will, thank you.')).toBeVisible();
  await guest.reload();
  await expect(guest.getByText('I will, thank you.')).toBeVisible();
}

async function removeAndUndo(page: Page): Promise<void> {
  const levels = page.getByRole('region', { name: /^Levels/ });
  await levels.getByRole('button', { name: 'Remove' }).first().click();
  await expect(levels.getByText('This note was removed.')).toBeVisible();
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(levels.getByText('loud chorus')).toBeVisible();
}
