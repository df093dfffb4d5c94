import { expect, test, type Page } from '@playwright/test';
import { badFiles, getScenario, takeFiles } from '@thudline/fixtures';
import { expectReadable } from './harness/readable';
import { wavFile } from './harness/wavFile';

const scenario = getScenario('hot-kick-opposite-overhead');
const bad = badFiles().find((file) => file.answer === 'refused')!;

test('join, add a take, read its sheet, flip, find it in the list, sign out', async ({ page }) => {
  await test.step('a guest reads what this is and joins', () => joinAsNewPlayer(page));
  await test.step('a file that is no recording is refused beside its name', () => meetRefusal(page));
  await test.step('two files become a take', () => addTake(page));
  await test.step('the sheet says what to do', () => readSheet(page));
  await test.step('flipping gives the low end back', () => flip(page));
  await test.step('the list shows the take', () => findInList(page));
  await test.step('after signing out the sheet is closed', () => signOut(page));
});

async function joinAsNewPlayer(page: Page): Promise<void> {
  await page.goto('/');
  await expect(page.getByRole('link', { name: 'Join' }).first()).toBeVisible();
  await expectReadable(page, 'first page');
  await page.goto('/join');
  await expectReadable(page, 'join');
  await page.getByLabel('Name').fill('Mika');
  await page.getByLabel('E-mail').fill('mika@example.org');
  await page.getByLabel('Password', { exact: true }).fill('a-quiet-kit-7');
  await page.getByRole('button', { name: 'Join' }).click();
  await expect(page).toHaveURL(/\/takes/);
  await expect(page.getByRole('heading', { name: /Your first take/ })).toBeVisible();
  await expectReadable(page, 'no takes yet');
}

async function meetRefusal(page: Page): Promise<void> {
  await page.goto('/takes/new');
  await expectReadable(page, 'new take, nothing chosen');
  await page.getByLabel('WAV files').setInputFiles([wavFile(bad.name, bad.bytes)]);
  await expect(page.getByText(bad.name).first()).toBeVisible();
  await expect(page.getByRole('alert').first()).toBeVisible();
  await page.getByRole('button', { name: `Clear ${bad.name}` }).click();
}

async function addTake(page: Page): Promise<void> {
  const { kick, overhead } = takeFiles(scenario.name);
  await page
    .getByLabel('WAV files')
    .setInputFiles([wavFile('kick in.wav', kick), wavFile('oh.wav', overhead)]);
  await expect(
    page.getByRole('group', { name: 'Microphone of kick in.wav' }).getByLabel('kick'),
  ).toBeChecked();
  await expect(
    page.getByRole('group', { name: 'Microphone of oh.wav' }).getByLabel('overhead'),
  ).toBeChecked();
  await page.getByLabel('Title').fill(scenario.title);
  await expectReadable(page, 'new take, two files');
  await page.getByRole('button', { name: 'Measure this take' }).click();
  await expect(page).toHaveURL(/\/takes\/[0-9a-f-]{36}$/);
  await expect(page.getByRole('progressbar', { name: 'Measuring' })).toBeVisible();
  await expect(page.getByText(/^Measuring: .* step [1-5] of 5$/)).toBeVisible();
}

async function readSheet(page: Page): Promise<void> {
  const line = page.getByRole('heading', { level: 1 });
  await expect(page.getByText(/Flip the overhead/).first()).toBeVisible({ timeout: 90_000 });
  await expect(line).toBeVisible();
  await expect(page.getByRole('heading', { name: /^Adding up: flip/ })).toBeVisible();
  await expect(page.getByRole('img', { name: /^Low end of the two added/ })).toBeVisible();
  await expectReadable(page, 'sheet');
  const action = page.getByRole('checkbox').first();
  await action.check();
  await page.reload();
  await expect(page.getByRole('checkbox').first()).toBeChecked();
}

async function flip(page: Page): Promise<void> {
  const choices = page.getByRole('group', { name: 'Choice' });
  await choices.getByRole('button', { name: 'as recorded' }).click();
  const lowEnd = page.getByRole('img', { name: /^Low end of the two added/ });
  await expect(lowEnd).toHaveAccessibleName(/a difference of [+−]?0\.0 dB/);
  await choices.getByRole('button', { name: 'flipped', exact: true }).click();
  await expect(lowEnd).toHaveAccessibleName(/a difference of \+[1-9]\.\d dB/);
  const play = page.getByRole('button', { name: /^Hit \d+, on repeat/ });
  await play.click();
  await page.getByRole('button', { name: /^Stop hit/ }).click();
  await expect(play).toBeVisible();
}

async function findInList(page: Page): Promise<void> {
  await page.getByRole('navigation', { name: 'Places' }).getByRole('link', { name: 'Takes' }).click();
  const row = page.getByRole('table', { name: 'Takes' }).getByRole('row', { name: scenario.title });
  await expect(row).toContainText('Flip the overhead');
  await expectReadable(page, 'takes');
  await row.getByRole('link').click();
  await expect(page.getByRole('heading', { name: /^Adding up: flip/ })).toBeVisible();
}

async function signOut(page: Page): Promise<void> {
  const sheetUrl = page.url();
  await page.getByRole('button', { name: 'Mika' }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page).toHaveURL(/\/sign-in/);
  await expectReadable(page, 'sign in');
  await page.goto(sheetUrl);
  await expect(page).toHaveURL(/\/sign-in/);
}
