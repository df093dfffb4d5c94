import { expect, test } from '@playwright/test';
import { appHeader, paths, roomResponse, type CreateRoomRequest } from '@thudline/contracts';
import { browserSettings } from '../harness/browserSettings';
import { joinAsNewcomer } from '../harness/newcomer';
import { takeShots } from './takeShots';

const shed: CreateRoomRequest = {
  name: 'The shed',
  shape: { kind: 'box', lengthM: 5.2, widthM: 3.1, heightM: 2.4 },
  surfaces: [
    { place: 'floor', materialId: 'concrete-floor', areaM2: null },
    { place: 'left', materialId: 'timber-door', areaM2: 2.5 },
    { place: 'right', materialId: 'heavy-curtain', areaM2: 6 },
  ],
  temperatureC: 20,
  kit: { xM: 3.45, yM: 1.5, turnedDeg: 0 },
};

test('calculator', async ({ page }) => {
  await joinAsNewcomer(page);
  const answer = await page.request.post(paths.rooms, {
    data: shed,
    headers: { [appHeader.name]: appHeader.value, Origin: browserSettings().publicUrl },
  });
  const { id } = roomResponse.parse(await answer.json());
  await page.goto(`/rooms/${id}/calculator`);
  await expect(page.getByRole('heading', { level: 1 })).toContainText('would');
  await takeShots(page, 'calculator');
  await page.getByRole('radio', { name: /^64.4 Hz/ }).focus();
  await page.keyboard.press('Space');
  await page.getByLabel('Where', { exact: true }).selectOption('floor');
  await takeShots(page, 'calculator-two-ways');
});

test.describe('of the demo', () => {
  test.use({ storageState: browserSettings().playerState });

  test('progress', async ({ page }) => {
    await page.goto('/progress');
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await takeShots(page, 'progress');
    await page.getByLabel('Figure').selectOption('headroom');
    await takeShots(page, 'progress-headroom');
  });
});
