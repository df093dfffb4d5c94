import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** The rules of WCAG 2.2 AA and what it builds on, as axe names them. */
const wcagTags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** Looks for accessibility faults on the page as it stands, in the light theme and in the dark one. */
export async function expectAccessibleInBothThemes(page: Page, name: string): Promise<void> {
  for (const colorScheme of ['dark', 'light'] as const) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    await expect(page.locator('html')).toHaveClass(colorScheme === 'dark' ? /dark/ : /^(?!.*dark)/);
    const { violations } = await new AxeBuilder({ page }).withTags(wcagTags).analyze();
    const found = violations.map(({ id, help, nodes }) => ({
      id,
      help,
      at: nodes.map(({ target }) => target),
    }));
    expect(found, `${name}, ${colorScheme}`).toEqual([]);
  }
}
