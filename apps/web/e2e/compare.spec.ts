import { expect, test, type Page } from '@playwright/test';
import { encodeWav } from '@thudline/dsp';
import { getScenario, synthesiseTake } from '@thudline/fixtures';
import { getDemoTake, starTitle } from './harness/apiSession';
import { browserSettings } from './harness/browserSettings';
import { joinAsNewcomer } from './harness/newcomer';
import { expectReadable } from './harness/readable';
import { hear, tapSound } from './harness/soundTap';
import { uploadTake, waitForSheet } from './harness/uploadTake';
import { wavFile } from './harness/wavFile';

const line = (page: Page) => page.getByRole('heading', { level: 1 });
const changed = (page: Page) => page.getByRole('table', { name: 'What changed, and how surely' });

test.describe('the demo player', () => {
  test.use({ storageState: browserSettings().playerState });

  test('compares a flip from the sheet, hears both and switches by key', async ({ page }) => {
    await tapSound(page);
    const [before, after] = [await getDemoTake(starTitle), await getDemoTake('Flipped, kick')];
    await page.goto(`/takes/${after.id}`);
    await page.getByRole('link', { name: `Compare with take ${before.number}` }).click();
    await expect(line(page)).toHaveText(/^The flip worked: \d\.\d dB of low end came back/);
    await expect(
      page.getByText(/the sound confirms it: the low end turned over in \d+ of \d+ hits/),
    ).toBeVisible();
    await expect(changed(page).getByRole('row', { name: /^low end, added up/ })).toContainText('fuller');
    await expect(changed(page).getByRole('row', { name: /^attack/ })).toContainText(
      'strength can’t be matched',
    );
    await expect(page.getByRole('img', { name: /^Third-octaves of the two added/ })).toBeVisible();
    await expectReadable(page, 'a comparison');

    await walkToFirstHit(page);
    await page.getByRole('button', { name: 'Both, from hit 1' }).click();
    await expect(page.getByRole('button', { name: 'Stop', exact: true })).toBeVisible();
    await expect(page.getByText(/^equally loud: take \d+ down \d+\.\d dB/)).toBeVisible();
    await page.keyboard.press('1');
    const heard = page.getByRole('group', { name: 'Take that is heard' });
    await expect(heard.getByRole('button').first()).toHaveAttribute('aria-pressed', 'true');
    expect((await hear(page)).levelDbfs).toBeGreaterThan(-60);
    await page.keyboard.press('0');
    await expect(page.getByRole('button', { name: /^Both, from hit \d+/ })).toBeVisible();
  });

  test('compares a take with itself: nothing changed', async ({ page }) => {
    const { id } = await getDemoTake(starTitle);
    await page.goto(`/compare/${id}/${id}`);
    await expect(line(page)).toHaveText(/^The same take twice: no clear change/);
    const words = changed(page)
      .getByRole('cell')
      .filter({ hasText: /^(no clear change|can’t tell|fuller|lower)$/ });
    await expect(words.filter({ hasText: 'no clear change' }).first()).toBeVisible();
    await expect(words.filter({ hasText: /fuller|lower/ })).toHaveCount(0);
  });
});

test('two chosen takes are compared; an inverted overhead is told though nothing was noted', async ({
  page,
}) => {
  await joinAsNewcomer(page, 'Ilse');
  await page.goto('/takes/new');
  await uploadTake(page, 'hot-kick-opposite-overhead');
  await waitForSheet(page);
  await page.goto('/takes/new');
  await uploadInverted(page, 'hot-kick-opposite-overhead');
  await waitForSheet(page);
  await page.goto('/takes');
  const boxes = page.getByRole('table', { name: 'Takes' }).getByRole('checkbox');
  await boxes.nth(0).check();
  await boxes.nth(1).check();
  await page.getByRole('link', { name: 'Compare', exact: true }).click();
  await expect(page).toHaveURL(/\/compare\//);
  await expect(line(page)).toHaveText(/^The overhead was flipped: \d\.\d dB of low end came back/);
  await expect(
    page.getByText(/^.*The sound says the overhead was flipped between these takes/),
  ).toBeVisible();
  await page.getByRole('link', { name: 'swap them' }).click();
  await expect(line(page)).toHaveText(/^The overhead was flipped: \d\.\d dB of low end was lost/);
});

/** The loudest hit may be the last one, with too little after it to listen to. */
async function walkToFirstHit(page: Page): Promise<void> {
  const play = page.getByRole('button', { name: /^Both, from hit/ });
  const hits = Number((await play.innerText()).match(/\d+/)?.[0]);
  for (let hit = hits; hit > 1; hit--) await page.keyboard.press('ArrowLeft');
}

async function uploadInverted(page: Page, scenario: string): Promise<void> {
  const { sampleRateHz, kick, overhead } = synthesiseTake(getScenario(scenario).parameters);
  const file = (name: string, samples: Float32Array) =>
    wavFile(name, encodeWav({ channels: [samples], sampleRateHz, bitDepth: 24 }));
  await page.getByLabel('WAV files').setInputFiles([
    file('kick in.wav', kick),
    file(
      'oh.wav',
      overhead.map((sample) => -sample),
    ),
  ]);
  await expect(
    page.getByRole('group', { name: 'Microphone of oh.wav' }).getByLabel('overhead'),
  ).toBeChecked();
  await page.getByRole('button', { name: 'Measure this take' }).click();
  await expect(page).toHaveURL(/\/takes\/[0-9a-f-]{36}$/);
}
