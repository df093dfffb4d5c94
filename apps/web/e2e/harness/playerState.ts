import { expect, request } from '@playwright/test';
import { browserSettings } from './browserSettings';

/** Signs the demo player in once, for every test that starts signed in. */
export async function keepPlayerState(): Promise<void> {
  const { publicUrl, demoPassword, playerState } = browserSettings();
  const context = await request.newContext({
    baseURL: publicUrl,
    extraHTTPHeaders: { 'X-Thudline': '1', Origin: publicUrl },
  });
  const data = { email: 'juno@example.org', password: demoPassword };
  const answer = await context.post('/api/auth/sign-in', { data });
  expect(answer.ok(), await answer.text()).toBe(true);
  await context.storageState({ path: playerState });
  await context.dispose();
}
