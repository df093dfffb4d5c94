import { expect, type Page } from '@playwright/test';
import { appHeader, createdShareResponse, paths } from '@thudline/contracts';
import { browserSettings } from './browserSettings';

/** A link through which notes may be left, made for whoever is signed in on the page; making links has a walk of its own. */
export async function linkToNote(page: Page, takeId: string): Promise<string> {
  const made = await page.request.post(paths.shares, {
    headers: { [appHeader.name]: appHeader.value, Origin: browserSettings().publicUrl },
    data: { subject: { kind: 'take', takeId }, question: 'Is it too loud?', canNote: true },
  });
  expect(made.ok(), await made.text()).toBe(true);
  const { url } = createdShareResponse.parse(await made.json());
  if (!url) throw new Error('A link that is not mailed tells its address.');
  return url;
}
