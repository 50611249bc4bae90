import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { openPane, searchOf } from "./setup/pane";
import { closePage, type WatchedPage } from "./setup/sheet-page";

let pane: WatchedPage;
beforeEach(async () => {
  pane = await openPane();
});
afterEach(() => closePage(pane));

describe("finding a function", () => {
  it("lists every function by family", async () => {
    const { page } = pane;
    const functions = await page.evaluate(
      async () => (await (await fetch("functions.json")).json()).functions,
    );
    expect(await page.getByRole("option").count()).toBe(functions.length);
    expect(await page.locator(".family-name").allTextContents()).toEqual(
      expect.arrayContaining(["Convert", "Correct", "Judge", "Weigh", "Survey"]),
    );
  });

  it.each([
    ["cold junction", "TEMPERATURE"],
    ["CJC", "TEMPERATURE"],
    ["thermocouple mV to deg", "TEMPERATURE"],
    ["guard band", "ACCEPTANCE"],
    ["TUS", "SURVEY"],
    ["pass fail", "VERDICT"],
    ["Pt100", "PRTEMPERATURE"],
  ])("puts among the first three for “%s”: %s", async (query, id) => {
    await searchOf(pane.page).fill(query);
    const first = await pane.page.getByRole("option").locator(".option-name").allTextContents();
    expect(first.slice(0, 3)).toContain(id);
  });

  it("opens a page by keyboard alone, goes on to a related one, and comes back", async () => {
    const { page } = pane;
    await page.keyboard.press("Tab");
    while (!(await searchOf(page).evaluate((field) => field === document.activeElement))) {
      await page.keyboard.press("Tab");
    }
    await page.keyboard.type("emf deviation");
    const second = page.getByRole("option").nth(1);
    const name = await second.locator(".option-name").textContent();
    await page.keyboard.press("ArrowDown");
    expect(await second.getAttribute("aria-selected")).toBe("true");
    await page.keyboard.press("Enter");
    expect(await page.locator(".function-page h2").textContent()).toBe(`BEAD.${name}`);
    expect(
      await page.locator(".function-page h2").evaluate((title) => title === document.activeElement),
    ).toBe(true);
    await page.locator(".related button").first().focus();
    const related = await page.locator(".related button").first().textContent();
    await page.keyboard.press("Enter");
    expect(await page.locator(".function-page h2").textContent()).toBe(`BEAD.${related}`);
    await page.keyboard.press("Escape");
    expect(await searchOf(page).evaluate((field) => field === document.activeElement)).toBe(true);
  });

  it("says so when nothing is found, and clears the search with Escape", async () => {
    const { page } = pane;
    await searchOf(page).fill("xylophone");
    expect(await page.locator(".count").textContent()).toContain("Nothing found");
    await searchOf(page).press("Escape");
    expect(await page.getByRole("option").count()).toBeGreaterThan(50);
  });

  it("shows list and page side by side where there is room", async () => {
    const { page } = pane;
    await page.setViewportSize({ width: 800, height: 700 });
    await searchOf(page).fill("emf");
    await page.getByRole("option").first().click();
    expect(await searchOf(page).isVisible()).toBe(true);
    expect(await page.locator(".function-page").isVisible()).toBe(true);
  });
});

describe("understanding a function", () => {
  it("shows live results of every function's examples that agree with what is printed", async () => {
    const { page } = pane;
    const ids = await page
      .getByRole("option")
      .evaluateAll((all) => all.map((each) => (each as HTMLElement).dataset.id!));
    for (const id of ids) {
      await page.locator(`[role=option][data-id="${id}"]`).first().click();
      const results = page.locator(".example .live-result");
      await expect
        .poll(() => results.locator(".value, .block, .fault").count(), { message: id })
        .toBe(await results.count());
      expect(await results.locator(".fault").count(), id).toBe(0);
      await page.getByRole("button", { name: "All functions" }).click();
    }
  });

  it("tells the errors in the function's own words", async () => {
    const { page } = pane;
    await searchOf(page).fill("TEMPERATURE");
    await searchOf(page).press("Enter");
    const errors = page.locator(".errors");
    await expect.poll(() => errors.textContent()).toContain("argument missing: emf");
    expect(await errors.textContent()).toMatch(/#N\/A.*above the limit of type K/);
    expect(await errors.textContent()).toContain("reference temperature missing");
  });

  it("works where no Excel is: the formula can be built and copied, not inserted", async () => {
    const { page } = pane;
    await searchOf(page).fill("TEMPERATURE");
    await searchOf(page).press("Enter");
    await page.getByRole("button", { name: "Build this formula" }).click();
    await page.getByLabel(/^emf/).fill("4.096");
    await page.getByLabel(/^type/).selectOption("K");
    await page.getByLabel(/^referenceTemperature/).fill("0");
    await expect.poll(() => page.locator(".outcome").textContent()).toContain("99.99");
    expect(await page.getByRole("button", { name: "Insert formula" }).count()).toBe(0);
    await page.getByRole("button", { name: "Copy formula" }).click();
    await expect.poll(() => page.locator(".said").textContent()).toMatch(/Cop/);
  });
});
