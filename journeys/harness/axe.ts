import axe from 'axe-core';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';

/** No violation of any rule axe knows, on the page as it stands. */
export async function expectNoViolations(page: Page, where: string): Promise<void> {
  await page.evaluate(axe.source);
  const violations = await page.evaluate(async () => {
    const { axe: run } = window as unknown as { axe: typeof axe };
    const result = await run.run();
    return result.violations.map(({ id, nodes }) => ({
      id,
      nodes: nodes
        .slice(0, 3)
        .map(({ html, failureSummary }) => `${html.slice(0, 200)} ${failureSummary ?? ''}`),
    }));
  });
  expect(violations, where).toEqual([]);
}
