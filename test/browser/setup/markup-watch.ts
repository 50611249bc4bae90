import type { Page } from "playwright-core";

/** Texts that would become markup, code or a request where a page took them for anything but texts. */
export const hostileTexts = [
  `<img src="/stolen" onerror="window.ran = 1">`,
  `<script>window.ran = 1</script>`,
  `"><svg onload="window.ran = 1">`,
  `<iframe srcdoc="<script>parent.ran = 1</script>"></iframe>`,
  `<a href="javascript:window.ran = 1">here</a>`,
  `javascript:window.ran = 1`,
  `<style>* { display: none }</style>`,
] as const;

/** From now on every element that comes into the page is looked at, also one that is taken away again at once. */
export async function watchMarkup(page: Page): Promise<void> {
  await page.evaluate(() => {
    const found: string[] = [];
    Object.assign(window, { foundMarkup: found });
    // The page's own scripts come from its own address, as the policy asks.
    const suspicious =
      "script:not([src]), iframe, object, embed, a[href^='javascript:' i], img[src*='stolen'], [onerror], [onload]";
    const look = (element: Element) => {
      for (const each of [element, ...element.querySelectorAll("*")]) {
        if (each.matches(suspicious)) found.push(each.outerHTML);
      }
    };
    new MutationObserver((records) => {
      for (const { target, addedNodes } of records) {
        for (const node of [target, ...addedNodes]) if (node instanceof Element) look(node);
      }
    }).observe(document, { subtree: true, childList: true, attributes: true });
  });
  page.on("request", (request) => {
    if (!request.url().includes("stolen")) return;
    void page.evaluate((url) => Reflect.get(window, "foundMarkup").push(url), request.url()).catch(() => {});
  });
}

/** What was found since, and whether any of the texts ran. */
export const markupFound = (page: Page): Promise<{ found: string[]; ran: boolean }> =>
  page.evaluate(() => ({ found: Reflect.get(window, "foundMarkup"), ran: "ran" in window }));
