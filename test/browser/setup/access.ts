import axe from "axe-core";
import type { Page } from "playwright-core";

/** Everything that WCAG 2.2 asks for up to AA and that a machine can check. */
const RULES = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"];

/** What a part of the page does to those who cannot see or point. */
export async function accessFaults(page: Page, part: string): Promise<string[]> {
  // Run by the browser's own command: the page's policy lets no script in, and must not for a test.
  await page.evaluate(axe.source);
  return page.evaluate(
    async ([place, tags]) => {
      const { axe: checker } = window as unknown as { axe: typeof axe };
      const { violations } = await checker.run(place, { runOnly: tags });
      return violations.flatMap(({ id, nodes }) =>
        nodes.map(({ html, failureSummary }) => `${id}: ${html} ${failureSummary}`),
      );
    },
    [part, RULES] as const,
  );
}
