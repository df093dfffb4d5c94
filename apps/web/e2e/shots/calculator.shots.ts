import { expect, test } from '@playwright/test';
import { listRoomsResponse, paths } from '@thudline/contracts';
import { apiSession } from '../harness/apiSession';
import { browserSettings } from '../harness/browserSettings';
import { takeShots } from './takeShots';

test.use({ storageState: browserSettings().playerState });

test('calculator', async ({ page }) => {
  const session = await apiSession(browserSettings().playerState);
  const { items } = listRoomsResponse.parse(await (await session.get(paths.rooms)).json());
  await session.dispose();
  const room = items.find(({ shape }) => shape.kind === 'box' && shape.heightM !== null)!;
  await page.goto(`/rooms/${room.id}/calculator`);
  await expect(page.getByRole('heading', { level: 1 })).toContainText('would');
  await takeShots(page, 'calculator');
});

test('progress', async ({ page }) => {
  await page.goto('/progress');
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await takeShots(page, 'progress');
});
