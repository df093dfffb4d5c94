import { expect, request, type APIRequestContext } from '@playwright/test';
import { appHeader, listTakesResponse, paths, type TakeListItem } from '@thudline/contracts';
import { browserSettings } from './browserSettings';

/** A visitor without a browser, for what a walk needs before it begins; `storageState` is who they are. */
export function apiSession(storageState?: string): Promise<APIRequestContext> {
  const { publicUrl } = browserSettings();
  return request.newContext({
    baseURL: publicUrl,
    extraHTTPHeaders: { [appHeader.name]: appHeader.value, Origin: publicUrl },
    storageState,
  });
}

/** The demo player's takes, newest first. */
export async function listDemoTakes(): Promise<TakeListItem[]> {
  const session = await apiSession(browserSettings().playerState);
  const answer = await session.get(`${paths.takes}?limit=100`);
  expect(answer.ok(), await answer.text()).toBe(true);
  const { items } = listTakesResponse.parse(await answer.json());
  await session.dispose();
  return items;
}

/**
 * A demo take by words of its title.
 *
 * @throws {Error} there is none
 */
export async function getDemoTake(title: string): Promise<TakeListItem> {
  const take = (await listDemoTakes()).find((item) => item.title.includes(title));
  if (!take) throw new Error(`The demo has no take called "${title}".`);
  return take;
}

/** Kick hot, overhead opposite: the take most walks read. */
export const starTitle = 'Loud chorus';
