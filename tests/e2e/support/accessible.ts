import { AxeBuilder } from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** WCAG 2.2, levels A and AA, as axe names its rules. */
const WCAG_22_AA = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** Fails with rule and elements when axe finds anything on the page as it stands. */
export async function expectNoViolation(page: Page, where = page.url()): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(WCAG_22_AA).analyze();
  const found = violations.map(({ id, help, nodes }) => ({
    rule: `${id}: ${help}`,
    elements: nodes.map(({ html, failureSummary }) => `${html}\n${failureSummary ?? ''}`),
  }));
  expect(found, where).toEqual([]);
}
