import { expect, test } from '@playwright/test';
import { joinAsNewcomer } from './harness/newcomer';
import { browserSettings } from './harness/browserSettings';
import { expectReadable } from './harness/readable';

test('a room is written down, a treatment tried on paper and put in its log', async ({ page }) => {
  await joinAsNewcomer(page);
  await page.goto('/rooms');
  await page.getByRole('button', { name: 'Add a room' }).click();
  const form = page.getByRole('dialog', { name: 'A room' });
  await form.getByLabel('Name').fill('The shed');
  await form.getByRole('button', { name: 'Keep this room' }).click();
  await page.getByRole('link', { name: 'Estimate a change before you make it' }).click();
  const head = page.getByRole('heading', { level: 1 });
  await expect(head).toContainText('Measure its length, width and height first.');
  await expectReadable(page, 'a calculator without measures');

  await page.getByRole('button', { name: 'Write it down' }).click();
  const details = page.getByRole('dialog', { name: 'The shed' });
  await details.getByLabel('Length, m').fill('5.2');
  await details.getByLabel('Width, m').fill('3.1');
  await details.getByLabel('Height, m').fill('2.4');
  await details.getByLabel('Temperature while you play, °C').fill('20');
  await details.getByLabel('Floor', { exact: true }).selectOption('concrete-floor');
  await details.getByRole('button', { name: 'add a part to: Left wall' }).click();
  await details.getByLabel('Part, m²').fill('2');
  await details.getByRole('button', { name: 'Put the kit on the plan' }).click();
  const kit = details.getByRole('button', { name: /^Kit, 2.60 m from the left, 1.55 m from the front/ });
  await kit.focus();
  for (let i = 0; i < 4; i++) await page.keyboard.press('ArrowRight');
  await expect(details.getByLabel('From the left, m')).toHaveValue('3');
  const box = (await details.getByRole('button', { name: /^Kit/ }).boundingBox())!;
  const middle = { x: box.x + box.width / 2, y: box.y + box.height / 2 };
  await page.mouse.move(middle.x, middle.y);
  await page.mouse.down();
  await page.mouse.move(middle.x + 30, middle.y, { steps: 3 });
  await page.mouse.up();
  await expect
    .poll(async () => Number(await details.getByLabel('From the left, m').inputValue()))
    .toBeGreaterThan(3.2);
  await details.getByLabel('From the left, m').fill('3.45');
  await expectReadable(page, 'a room being written down');
  await details.getByRole('button', { name: 'Keep this room' }).click();

  await expect(head).toHaveText(/^8 m² of wool would calm 500 Hz: .* The boom at 65 Hz stays\.$/);
  await expect(page.getByText('At 66 Hz the kit stands where the room gives nothing; try')).toBeVisible();
  await page.getByRole('radio', { name: /^66.0 Hz/ }).focus();
  await page.keyboard.press('ArrowDown');
  await expect(page.getByText('72 Hz stands between floor and ceiling')).toBeVisible();
  await page.getByLabel('Material').selectOption('curtain');
  await page.getByLabel('Where', { exact: true }).selectOption('back');
  await expect(head).toHaveText(/^8 m² of curtain/);
  await page.reload();
  await expect(head).toHaveText(/^8 m² of curtain/);
  await page.getByText('as a table').click();
  await expect(page.getByRole('row', { name: /^125 Hz/ })).toBeVisible();
  await page.getByRole('button', { name: 'all modes' }).click();
  await expectReadable(page, 'the calculator');

  await page.getByRole('button', { name: 'Put this plan in the room log' }).click();
  await page.getByRole('link', { name: 'the room log' }).click();
  await expect(page.getByText('Planned: 8 m² of heavy curtain, draped, on the back wall')).toBeVisible();
});

test.describe('the demo’s progress', () => {
  test.use({ storageState: browserSettings().playerState });

  test('is told week by week, figure by figure', async ({ page }) => {
    await page.goto('/takes');
    await page.getByRole('link', { name: 'Progress' }).click();
    await expect(page.getByRole('img', { name: /^level spread of kicks of \d+ takes/ })).toBeVisible();
    await expectReadable(page, 'progress');
    await page.getByLabel('Figure').selectOption('headroom');
    await expect(page.getByText('A cross is a take that clipped.', { exact: false })).toBeVisible();
    await expect(page.getByRole('table')).toBeVisible();
  });
});
