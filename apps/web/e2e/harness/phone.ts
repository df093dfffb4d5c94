import { expect, type Page } from '@playwright/test';

/** The narrowest phone the pages are made for. */
const phone = { width: 360, height: 740 };
const desk = { width: 1280, height: 720 };

/** On a phone nothing may reach past the right edge: reading would mean scrolling sideways. */
export async function expectFitsPhone(page: Page, name: string): Promise<void> {
  await page.setViewportSize(phone);
  const widthPx = () => page.evaluate(() => document.documentElement.scrollWidth);
  await expect.poll(widthPx, `${name} at ${phone.width} px`).toBeLessThanOrEqual(phone.width);
  await page.setViewportSize(desk);
}
