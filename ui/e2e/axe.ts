import { AxeBuilder } from '@axe-core/playwright';
import { type Page } from 'playwright-core';

/** WCAG 2.2 A and AA, as axe names its rules. */
const TAGS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/**
 * Looks for what keeps people out of the page as it stands.
 *
 * @returns one line per rule and place that was broken; empty when nothing was found.
 */
export async function barriers(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(TAGS)
    // Fluent's focus keepers: empty, out of the reading order, there for the Tab key only.
    .exclude('[data-tabster-dummy]')
    .analyze();
  return violations.flatMap(({ id, help, nodes }) =>
    nodes.map(
      ({ target, failureSummary }) => `${id}: ${help} ${target.join(' ')} ${failureSummary}`,
    ),
  );
}

/** Pixels that the page is wider than its window; more than 0 makes it scroll sideways. */
export function overhang(page: Page): Promise<number> {
  return page.evaluate(() => {
    const { scrollWidth, clientWidth } = document.documentElement;
    return scrollWidth - clientWidth;
  });
}
