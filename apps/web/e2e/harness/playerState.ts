import { rename } from 'node:fs/promises';
import { expect } from '@playwright/test';
import { paths } from '@thudline/contracts';
import { apiSession } from './apiSession';
import { browserSettings } from './browserSettings';

/** Signs the demo player in, for every test that starts signed in; a test never finds half a file. */
export async function keepPlayerState(): Promise<void> {
  const { demoPassword, playerState } = browserSettings();
  const session = await apiSession();
  const data = { email: 'juno@example.org', password: demoPassword };
  const answer = await session.post(paths.signIn, { data });
  expect(answer.ok(), await answer.text()).toBe(true);
  await session.storageState({ path: `${playerState}.new` });
  await rename(`${playerState}.new`, playerState);
  await session.dispose();
}
