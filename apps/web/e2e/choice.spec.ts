import { expect, test, type Page } from '@playwright/test';
import { paths, reportResponse, type Choice } from '@thudline/contracts';
import { apiSession, getDemoTake, starTitle } from './harness/apiSession';
import { browserSettings } from './harness/browserSettings';

test.use({ storageState: browserSettings().playerState });

/** The page computes from the pair spectrum as sent, rounded to 32 bits; two decimals is what it shows. */
const toleranceDb = 0.01;

test('a choice set by keyboard has the low end that the server measured', async ({ page }) => {
  const { id } = await getDemoTake(starTitle);
  const measured = await measuredChoices(id);
  await page.goto(`/takes/${id}`);
  const polarity = page.getByLabel('Polarity of the overhead');
  await expectLowEnd(page, measured.flipped);

  await polarity.focus();
  await page.keyboard.press('ArrowDown');
  await expect(polarity).toHaveValue('not flipped');
  await expectLowEnd(page, measured['as-recorded']);

  await page.getByLabel('Overhead earlier, ms').focus();
  await page.keyboard.press('ControlOrMeta+A');
  await page.keyboard.type(String(measured.shifted.shiftMs));
  await expectLowEnd(page, measured.shifted);

  await polarity.focus();
  await page.keyboard.press('ArrowUp');
  await expect(polarity).toHaveValue('flipped');
  await expectLowEnd(page, measured['shifted-flipped']);
});

test('single keys take the named choices and walk the hits, without a request', async ({ page }) => {
  const { id } = await getDemoTake(starTitle);
  const measured = await measuredChoices(id);
  await page.goto(`/takes/${id}`);
  await expectLowEnd(page, measured.flipped);
  const asked: string[] = [];
  page.on('request', (request) => asked.push(request.url()));
  await page.keyboard.press('1');
  await expectLowEnd(page, measured['as-recorded']);
  await page.keyboard.press('2');
  await expectLowEnd(page, measured.flipped);
  expect(asked.filter((url) => url.includes('/api/'))).toEqual([]);
  const hit = page.getByRole('button', { name: /^Hit \d+, on repeat/ });
  const before = await hit.innerText();
  await page.keyboard.press('ArrowRight');
  await expect(hit).not.toHaveText(before);
});

async function measuredChoices(takeId: string): Promise<Record<Choice['name'], Choice>> {
  const session = await apiSession(browserSettings().playerState);
  const answer = await session.get(paths.report(takeId));
  const { agreement } = reportResponse.parse(await answer.json());
  await session.dispose();
  return Object.fromEntries(agreement.choices.map((choice) => [choice.name, choice])) as Record<
    Choice['name'],
    Choice
  >;
}

async function expectLowEnd(page: Page, { lowEndDb }: Choice): Promise<void> {
  const shownDb = async () => Number(await page.locator('[data-low-end-db]').getAttribute('data-low-end-db'));
  await expect.poll(async () => Math.abs((await shownDb()) - lowEndDb)).toBeLessThan(toleranceDb);
}
