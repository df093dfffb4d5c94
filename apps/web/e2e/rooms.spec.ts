import { readFileSync } from 'node:fs';
import { expect, test, type Locator, type Page } from '@playwright/test';
import { listRoomsResponse, paths } from '@thudline/contracts';
import { apiSession, getDemoTake, starTitle } from './harness/apiSession';
import { browserSettings } from './harness/browserSettings';
import { expectReadable } from './harness/readable';

test.use({ storageState: browserSettings().playerState });

const headline = (page: Page) => page.getByRole('heading', { level: 1 });
const entry = (page: Page, what: string): Locator =>
  page.locator('main li').filter({ has: page.getByRole('heading', { level: 3, name: what }) });

async function openGarage(page: Page): Promise<void> {
  await page.goto('/rooms');
  await page.getByRole('link', { name: 'The garage' }).click();
  await expect(headline(page)).toBeVisible();
}

test('the demo’s room says what each change did, and no more', async ({ page }) => {
  await page.goto('/rooms');
  await expect(page.getByRole('row', { name: /^The garage/ })).toBeVisible();
  await expectReadable(page, 'rooms');
  await openGarage(page);
  await expect(headline(page)).toHaveText(
    /^Four panels on the walls: a snare dies 0\.35 s sooner at 500 Hz\. Fan heater off/,
  );
  const says: [string, string | RegExp][] = [
    ['Kit turned 30° out of the corner', /No take since then\. Record one the way you recorded take \d+/],
    ['Four panels on the walls', /Sure: 7 hits before, 7 after\./],
    ['Fan heater off, string lights on', 'The overhead’s noise floor fell 6 dB, to −56 dBFS.'],
    ['Fridge plugged in behind the wall', 'The overhead’s noise floor rose 9 dB, to −61 dBFS. Switch it off'],
    ['Rug under the kit', 'No clear change in decay, low end or noise.'],
    [
      'Kit moved to the middle',
      'Can’t be compared: the kick microphone moved as well, from 0 cm to 5 cm inside.',
    ],
    ['Kit set up in the corner', 'No take before it. There is nothing to compare with.'],
  ];
  for (const [what, words] of says) await expect(entry(page, what)).toContainText(words);
  const rows = entry(page, 'Rug under the kit').getByRole('list', { name: 'Figures of change 3' });
  await expect(rows.getByText('no clear change')).toHaveCount(4);
  await expect(
    entry(page, 'Four panels on the walls').getByRole('img', { name: /^decay at 500 Hz: .* shorter\.$/ }),
  ).toBeVisible();
  await entry(page, 'Four panels on the walls').getByText('as a table').click();
  await expectReadable(page, 'a room');
});

test('a figure over time: another figure, nearer, as a table and as CSV', async ({ page }) => {
  await openGarage(page);
  const over = page.getByRole('region', { name: 'Over time' });
  await expect(over.getByRole('img', { name: /^decay at 500 Hz of 8 takes/ })).toBeVisible();
  await over.getByLabel('Figure', { exact: true }).selectOption({ label: 'noise floor, overhead' });
  await expect(over.getByRole('img', { name: /^noise floor, overhead of \d+ takes/ })).toBeVisible();
  const picture = over.getByRole('group', { name: /^Picture over time/ });
  const rings = picture.locator('circle[r="4.6"]');
  const all = await rings.count();
  await picture.focus();
  await page.keyboard.press('+');
  await page.keyboard.press('ArrowRight');
  expect(await rings.count()).toBeLessThan(all);
  for (let i = 0; i < 3; i++) await page.keyboard.press('-');
  await expect(rings).toHaveCount(all);
  await over.getByText('as a table').click();
  await expect(over.getByRole('row')).toHaveCount(all + 1);
  await expectReadable(page, 'a figure over time');
  const download = page.waitForEvent('download');
  await over.getByRole('button', { name: 'keep as CSV' }).click();
  const text = readFileSync(await (await download).path(), 'utf8');
  expect(text.split('\r\n')[0]).toBe(
    'take,recorded at,"noise floor, overhead, dBFS",between the quartiles,setup',
  );
  expect(text.trim().split('\r\n')).toHaveLength(all + 1);
  await over.getByLabel('Takes', { exact: true }).selectOption({ label: 'under the rafters' });
  await expect.poll(() => rings.count()).toBeLessThan(all);
});

test('before and after a change are heard equally loud', async ({ page }) => {
  await openGarage(page);
  const panels = entry(page, 'Four panels on the walls');
  await panels.getByRole('button', { name: 'Hear it' }).click();
  await panels.getByRole('button', { name: 'A hard snare' }).click();
  // It is said once both are there and matched.
  await expect(panels.getByText(/^equally loud(: take \d+ down [\d.]+ dB| as they are)$/)).toBeVisible();
  await panels.getByRole('button', { name: 'before' }).click();
  await expect(panels.getByRole('button', { name: 'before' })).toHaveAttribute('aria-pressed', 'true');
  await expectReadable(page, 'a change that is heard');
});

test('a room gets changes with a place and a photo, put in order and taken out again', async ({ page }) => {
  await page.goto('/rooms');
  await page.getByRole('button', { name: 'Add a room' }).click();
  const form = page.getByRole('dialog');
  await form.getByLabel('Name').fill('Attic');
  await form.getByLabel('Length, m').fill('4');
  await form.getByLabel('Width, m').fill('3');
  await expectReadable(page, 'a new room');
  await form.getByRole('button', { name: 'Keep this room' }).click();
  await expect(headline(page)).toContainText('Nothing is written down yet.');

  for (const what of ['Rug', 'Curtain']) {
    await page.getByRole('button', { name: 'I changed something' }).click();
    const change = page.getByRole('dialog', { name: 'What did you change?' });
    await change.getByLabel('What you changed').fill(what);
    await change.locator('svg').click({ position: { x: 60, y: 60 } });
    await expect(change.getByLabel('From the front, m')).not.toHaveValue('');
    if (what === 'Rug') await expectReadable(page, 'a new change');
    await change.getByRole('button', { name: 'Keep it in the log' }).click();
    await expect(entry(page, what)).toContainText('on the plan');
  }
  const order = page.locator('main li').getByRole('heading', { level: 3 });
  await expect(order).toHaveText([/2 Curtain/, /1 Rug/]);
  await page.getByRole('button', { name: 'put change 2 earlier that day' }).click();
  await expect(order).toHaveText([/2 Rug/, /1 Curtain/]);

  await page.setInputFiles('input[aria-label="photo of change 2"]', {
    name: 'rug.png',
    mimeType: 'image/png',
    buffer: Buffer.from(onePixelPng, 'base64'),
  });
  await expect(page.getByRole('img', { name: 'Change 2: Rug' })).toBeVisible();
  await expectReadable(page, 'changes with a photo');
  const download = page.waitForEvent('download');
  await page.getByRole('link', { name: 'keep all of this room as a file' }).click();
  expect((await download).suggestedFilename()).toBe('attic.zip');
  expect(
    readFileSync(await (await download).path())
      .subarray(0, 2)
      .toString(),
  ).toBe('PK');

  for (const number of [2, 1]) {
    await page.getByRole('button', { name: `edit change ${number}` }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'remove it' }).click();
    await expect(page.getByRole('heading', { level: 3 })).toHaveCount(number - 1);
  }
  await removeRoom('Attic');
});

test('a take’s sheet leads to its room, which can be changed and changed back', async ({ page }) => {
  const { id } = await getDemoTake(starTitle);
  await page.goto(`/takes/${id}`);
  const room = page.getByRole('link', { name: 'The garage' });
  await expect(room).toBeVisible();
  await page.getByRole('button', { name: 'Recorded in: change' }).click();
  await page.getByLabel('Recorded in', { exact: true }).selectOption({ label: 'no room' });
  await expect(page.getByRole('button', { name: 'Recorded in: say in which room' })).toBeVisible();
  await page.getByRole('button', { name: 'Undo' }).click();
  await room.click();
  await expect(page).toHaveURL(/\/rooms\//);
});

async function removeRoom(name: string): Promise<void> {
  const session = await apiSession(browserSettings().playerState);
  const { items } = listRoomsResponse.parse(await (await session.get(paths.rooms)).json());
  for (const { id } of items.filter((room) => room.name === name)) await session.delete(paths.room(id));
  await session.dispose();
}

const onePixelPng =
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==';
