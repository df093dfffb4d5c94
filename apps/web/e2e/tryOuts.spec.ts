import { expect, test, type Page } from '@playwright/test';
import { listTakesResponse, listTryOutsResponse, paths } from '@thudline/contracts';
import { encodeWav } from '@thudline/dsp';
import { getScenario, groove, synthesiseTake } from '@thudline/fixtures';
import { apiSession } from './harness/apiSession';
import { browserSettings } from './harness/browserSettings';
import { joinAsNewcomer } from './harness/newcomer';
import { expectReadable } from './harness/readable';
import { wavFile } from './harness/wavFile';

/** Centimetres above the snare; made so that the kick is fuller as recorded the higher the overhead hangs. */
const heightsCm = Array.from({ length: 12 }, (_, i) => 40 + 6 * i);
const snareM = 0.68;

/** Two bars of one groove, the overhead at one height. */
function heightFiles(heightCm: number) {
  const { parameters } = getScenario('overhead-180-cm');
  const { sampleRateHz, kick, overhead } = synthesiseTake({
    ...parameters,
    durationS: 6.2,
    strikes: groove({
      startS: 0.4,
      bars: 2,
      beatsPerMinute: 95,
      seed: 3,
      spreadDb: 3,
      patterns: [{ kick: [0, 6, 8, 14], snare: [4, 12], hat: [2, 10] }],
    }),
    placement: { ...parameters.placement, overhead: [2.4, 1.14, snareM + heightCm / 100] },
  });
  const wav = (samples: Float32Array) => encodeWav({ channels: [samples], sampleRateHz, bitDepth: 16 });
  return [wavFile(`Kick_${heightCm}cm.wav`, wav(kick)), wavFile(`OH_${heightCm}cm.wav`, wav(overhead))];
}

const progress = (page: Page, name: RegExp) => page.getByRole('progressbar', { name });
const rankedRows = (page: Page) =>
  page.getByRole('table', { name: 'The takes, best first' }).getByRole('rowgroup').getByRole('row');

test('twelve takes are sent in one go, survive a reload and are ranked as they were made', async ({
  page,
}) => {
  const files = heightsCm.flatMap(heightFiles);
  await joinAsNewcomer(page);
  await page.goto('/tryouts/new');
  await page.getByLabel('WAV files').setInputFiles([...files].reverse());
  await expect(page.getByRole('heading', { name: /^12 pairs are here/ })).toBeVisible();
  await expect(page.getByLabel('Overhead at, take 1', { exact: true })).toHaveValue('40');
  await expect(page.getByLabel('Overhead at, take 12')).toHaveValue('106');
  await page.getByRole('radio', { name: 'Take 6 is how things stand now' }).check();
  await expectReadable(page, 'a new try-out');

  let sent = 0;
  await page.route(`**${paths.takes}`, async (route) => {
    if (route.request().method() !== 'POST') return route.fallback();
    sent += 1;
    return sent > 8 ? route.abort() : route.fallback();
  });
  await page.getByRole('button', { name: 'Send and rank them' }).click();
  await expect(page).toHaveURL(/\/tryouts\/[0-9a-f-]{36}$/);
  await expect(progress(page, /^(Sending|Measuring) the takes/).first()).toBeVisible();
  await expect(page.getByText(/did not arrive/).first()).toBeVisible({ timeout: 90_000 });
  await page.unroute(`**${paths.takes}`);

  await page.reload();
  await expect(page.getByText('4 pairs weren’t sent yet:')).toBeVisible();
  await expectReadable(page, 'a try-out whose pairs are not all there');
  await page.getByLabel('WAV files').setInputFiles(files);
  await expect(page.getByText(/weren’t sent yet/)).toHaveCount(0);
  await expect(rankedRows(page)).toHaveCount(12, { timeout: 150_000 });
  await expect(progress(page, /the takes/)).toHaveCount(0);

  await page.getByLabel('Polarity', { exact: true }).selectOption('as-recorded');
  const order = () =>
    rankedRows(page)
      .getByRole('radio')
      .evaluateAll((radios) => radios.map((radio) => /^\d+/.exec(radio.ariaLabel ?? '')?.[0]));
  await expect.poll(order).toEqual([...heightsCm].reverse().map(String));
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(/^Raise the overhead to 106 cm:/);
  await expectReadable(page, 'a ranked try-out');

  const answer = await page.request.get(`${paths.takes}?limit=100`);
  expect(listTakesResponse.parse(await answer.json()).everyTotal).toBe(12);
});

test.describe('the demo’s try-out', () => {
  test.use({ storageState: browserSettings().playerState });

  test('is heard in step, chosen without knowing which is which, and kept with a reason', async ({
    page,
  }) => {
    const session = await apiSession(browserSettings().playerState);
    const list = listTryOutsResponse.parse(await (await session.get(paths.tryOuts)).json());
    await session.dispose();
    await page.goto('/takes');
    await page.getByRole('link', { name: 'Try-outs' }).click();
    await expect(page.getByRole('list', { name: 'Try-outs' })).toBeVisible();
    await expectReadable(page, 'try-outs');
    await page.getByRole('link', { name: 'How high the overhead hangs' }).click();
    await expect(page).toHaveURL(`/tryouts/${list.items[0]?.id}`);
    await expect(page.getByRole('heading', { level: 1 })).toHaveText(/^Raise the overhead to 112 cm:/);
    await page.getByRole('button', { name: 'Hear them all' }).click();
    await expect(page.getByRole('button', { name: 'Stop' })).toBeVisible();
    await expect(page.getByText(/turned down|as loud as they are/)).toBeVisible();
    await page.keyboard.press('2');
    const heard = page.getByRole('group', { name: 'Which take is heard' });
    await expect(heard.getByRole('button', { pressed: true })).toHaveText('55');
    await page.getByRole('button', { name: 'shuffle and hide the heights' }).click();
    await expect(page.getByText(/112/)).toHaveCount(0);
    await expectReadable(page, 'a try-out with its heights hidden');
    await page.getByRole('button', { name: 'B is best' }).click();
    await page.getByRole('radio', { name: /^112 cm/ }).check();
    await page.getByLabel('Why 112 cm wins, in your words').fill('Fullest kick.');
    await page.getByRole('button', { name: 'Make 112 cm the setup' }).click();
    await expect(page.getByText('112 cm is the setup now.')).toBeVisible();
    await expectReadable(page, 'a try-out with a winner');
    await page.getByRole('link', { name: /overhead 112 cm$/ }).click();
    await expect(page.getByLabel('Above the snare')).toHaveValue('112');
    await page.goBack();
    await page.getByRole('button', { name: 'Undo' }).click();
    await expect(page.getByRole('button', { name: 'Make 112 cm the setup' })).toBeVisible();
    await page.getByRole('button', { name: 'change its takes' }).click();
    await expectReadable(page, 'a try-out whose takes are being changed');
    await page
      .getByRole('button', { name: /^Take out/ })
      .first()
      .click();
    await expect(page.getByRole('button', { name: /^Take out/ })).toHaveCount(4);
    await page.getByRole('button', { name: 'Undo' }).click();
    await expect(page.getByRole('button', { name: /^Take out/ })).toHaveCount(5);
  });
});
