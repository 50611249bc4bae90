import { createHash } from "node:crypto";
import { describe, expect, it } from "vitest";
import allowed from "../../src/local-sheet/style-hashes.json";
import { closePage, openPage, openSheet } from "./setup/sheet-page";

describe("the pages", () => {
  it("allow exactly the style sheets that the grid engine writes into the page", async () => {
    const sheet = await openSheet();
    const { page } = sheet;
    // A dialog of the engine brings a further one, against scrolling behind it.
    await page.locator("#grid").getByText("Try it", { exact: true }).click({ button: "right" });
    await page.getByText("Delete", { exact: true }).last().click();
    await page.locator("[role=dialog] button").first().waitFor();
    await page.locator("body[data-scroll-locked]").waitFor();
    const texts = await page.locator("style").allTextContents();
    // The empty one as well: the engine puts an empty style sheet into the page first and fills it then.
    const hashes = ["", ...texts].map(
      (text) => `sha256-${createHash("sha256").update(text).digest("base64")}`,
    );
    expect([...new Set(hashes)].sort(), "copy these hashes to src/local-sheet/style-hashes.json").toEqual(
      [...allowed].sort(),
    );
    await closePage(sheet);
  });

  it.each(["light", "dark"] as const)(
    "start %s when the system is so, and follow it",
    async (colorScheme) => {
      const sheet = await openSheet({ colorScheme });
      const paper = await sheet.page.evaluate(
        () => getComputedStyle(document.documentElement).backgroundColor,
      );
      expect(paper).toBe(colorScheme === "dark" ? "rgb(28, 29, 32)" : "rgb(251, 250, 247)");
      const gridIsDark = () => sheet.page.locator("html.univer-dark").count();
      expect(await gridIsDark()).toBe(colorScheme === "dark" ? 1 : 0);
      const other = colorScheme === "dark" ? "light" : "dark";
      await sheet.page.emulateMedia({ colorScheme: other });
      await expect.poll(gridIsDark).toBe(other === "dark" ? 1 : 0);
      await closePage(sheet);
    },
  );

  it.each([
    ["in the pane, with Office.js but no Excel around it", "taskpane.html", { office: "script" }],
    ["in the pane, where Office.js cannot be reached", "taskpane.html", { office: "absent" }],
    ["beside the grid", "sheet.html", {}],
  ] as const)("list every function by keyboard %s", async (_, path, options) => {
    const watched = await openPage(path, { viewport: { width: 700, height: 800 }, ...options });
    const { page } = watched;
    const entries = page.getByRole("option");
    await entries.first().waitFor();
    const functions = await page.evaluate(
      async () => (await (await fetch("functions.json")).json()).functions,
    );
    expect(await entries.count()).toBe(functions.length);
    await page.getByRole("combobox", { name: "What do you want to do?" }).focus();
    await page.keyboard.press("ArrowDown");
    await page.keyboard.press("Enter");
    expect(await page.locator("dl.arguments").isVisible()).toBe(true);
    if (path === "sheet.html") await page.waitForFunction(() => window.beadlineSheet !== undefined);
    await closePage(watched);
  });

  it("hide and show the pane on the local sheet", async () => {
    const sheet = await openSheet();
    const button = sheet.page.getByRole("button", { name: /pane$/ });
    await button.click();
    expect(await sheet.page.locator("#functions").isVisible()).toBe(false);
    expect(await button.getAttribute("aria-expanded")).toBe("false");
    await closePage(sheet);
  });
});
