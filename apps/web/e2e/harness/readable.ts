import { type Page } from '@playwright/test';
import { expectAccessibleInBothThemes } from './accessibility';
import { expectFitsPhone } from './phone';

/** What every page has to stand, in the same visit: both themes without accessibility faults, and a narrow phone. */
export async function expectReadable(page: Page, name: string): Promise<void> {
  await expectAccessibleInBothThemes(page, name);
  await expectFitsPhone(page, name);
}
