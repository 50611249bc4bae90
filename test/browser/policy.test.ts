/**
 * What the browser itself refuses on each page, and that no page of ours even tries. The words of the policies are held
 * by test/build/policy.test.ts.
 */
import type { Page } from "playwright-core";
import { afterEach, describe, expect, it } from "vitest";
import { buildFormula, openPane, openSheetWithPane, openView, paneOf, searchOf, select } from "./setup/pane";
import { closePage, openPage, type PageOptions, type WatchedPage, waitForValue } from "./setup/sheet-page";

let watched: WatchedPage;
afterEach(() => watched.page.context().close());

const pages = [
  ["the pane where Office.js cannot be reached", "taskpane.html", { office: "absent" }],
  ["the pane with Office.js and no Excel around it", "taskpane.html", { office: "script" }],
  ["the local sheet", "sheet.html", {}],
] as const satisfies readonly (readonly [string, string, PageOptions])[];

/** Each a way to run a text as code, to load from elsewhere or to send something there; tried in a task of the page. */
const attempts = {
  // biome-ignore lint/security/noGlobalEval: this is what must be refused
  eval: () => globalThis.eval("window.ran = 1"),
  "new Function": () => new Function("window.ran = 1")(),
  "a generator's constructor": () =>
    Object.getPrototypeOf(function* () {})
      .constructor("window.ran = 1")()
      .next(),
  "a timer of a text": () => setTimeout("window.ran = 1" as never),
  "an inline script": () => {
    const script = document.createElement("script");
    script.textContent = "window.ran = 1";
    document.body.append(script);
  },
  "a handler in an attribute": () => {
    const image = document.createElement("img");
    image.setAttribute("onerror", "window.ran = 1");
    image.src = "data:,no-picture";
    document.body.append(image);
  },
  "a javascript: address": () => {
    const link = document.createElement("a");
    link.href = "javascript:void(window.ran = 1)";
    link.click();
  },
  "a script from elsewhere": () => {
    const script = document.createElement("script");
    script.src = "http://127.0.0.1:9/x.js";
    document.body.append(script);
  },
  "a script from a blob": () => {
    const script = document.createElement("script");
    script.src = URL.createObjectURL(new Blob(["window.ran = 1"], { type: "text/javascript" }));
    document.body.append(script);
  },
  "another thread from a blob": () => {
    new Worker(URL.createObjectURL(new Blob(["1"], { type: "text/javascript" })));
  },
  "a style sheet from elsewhere": () => {
    const link = document.createElement("link");
    link.rel = "stylesheet";
    link.href = "http://127.0.0.1:9/x.css";
    document.head.append(link);
  },
  "an inline style sheet": () => {
    const style = document.createElement("style");
    style.textContent = "body { background: url(http://127.0.0.1:9/x.png) }";
    document.head.append(style);
  },
  "a picture from elsewhere": () => {
    new Image().src = "http://127.0.0.1:9/x.png";
  },
  "a request to elsewhere": () => fetch("http://127.0.0.1:9/x").catch(() => {}),
  "a beacon to elsewhere": () => navigator.sendBeacon("http://127.0.0.1:9/x", "cells"),
  "a socket to elsewhere": () => {
    new WebSocket("ws://127.0.0.1:9/x");
  },
  "a frame": () => {
    const frame = document.createElement("iframe");
    frame.src = "http://127.0.0.1:9/x";
    document.body.append(frame);
  },
  "a form sent elsewhere": () => {
    const form = document.createElement("form");
    form.action = "http://127.0.0.1:9/x";
    document.body.append(form);
    form.submit();
  },
  "another base address": () => {
    const base = document.createElement("base");
    base.href = "http://127.0.0.1:9/";
    document.head.append(base);
  },
} as const;

/** Which part of the policy refuses what. */
const directives: Readonly<Record<keyof typeof attempts, string>> = {
  eval: "script-src",
  "new Function": "script-src",
  "a generator's constructor": "script-src",
  "a timer of a text": "script-src",
  "an inline script": "script-src-elem",
  "a handler in an attribute": "script-src-attr",
  "a javascript: address": "script-src-elem",
  "a script from elsewhere": "script-src-elem",
  "a script from a blob": "script-src-elem",
  "another thread from a blob": "worker-src",
  "a style sheet from elsewhere": "style-src-elem",
  "an inline style sheet": "style-src-elem",
  "a picture from elsewhere": "img-src",
  "a request to elsewhere": "connect-src",
  "a beacon to elsewhere": "connect-src",
  "a socket to elsewhere": "connect-src",
  "a frame": "frame-src",
  "a form sent elsewhere": "form-action",
  "another base address": "base-uri",
};

/** Tries it in a task of the page's own: what a debugger evaluates is free of the policy. */
const attempt = (page: Page, code: string): Promise<void> =>
  page.evaluate(
    (text) =>
      new Promise<void>((resolve) => {
        const channel = new MessageChannel();
        // Made here, where the debugger may; run there, where the page may not.
        const run = new Function(`return (${text})()`);
        channel.port1.onmessage = () => {
          try {
            run();
          } catch {}
          setTimeout(resolve, 50);
        };
        channel.port2.postMessage(0);
      }),
    code,
  );

describe.each(pages)("%s", (_, path, options) => {
  it("runs no text as code, loads nothing from elsewhere and sends nothing there; each try is noticed", async () => {
    watched = await openPage(path, options);
    const { page, faults } = watched;
    await paneOf(page).waitFor();
    const noticed: Record<string, string> = {};
    for (const [name, code] of Object.entries(attempts)) {
      faults.length = 0;
      await attempt(page, code.toString());
      await expect.poll(() => faults.join("\n"), { message: name }).toContain("policy violation: ");
      noticed[name] = /policy violation: (\S+)/.exec(faults.join("\n"))![1]!;
    }
    expect(noticed).toEqual(directives);
    expect(await page.evaluate(() => Reflect.get(window, "ran"))).toBeUndefined();
  });

  it("is found out when it reaches another origin where the policy would let it", async () => {
    watched = await openPage(path, options);
    const { page, faults } = watched;
    await paneOf(page).waitFor();
    // Going to another page is no matter of the policy.
    await page.evaluate(() => setTimeout(() => location.assign("http://127.0.0.1:9/"), 0));
    await expect.poll(() => faults.join("\n")).toContain("request to http://127.0.0.1:9/");
  });
});

const drawn = (page: Page) => page.locator(".plot canvas").filter({ visible: true }).first().waitFor();

describe("used in all their parts, without one violation of their policy,", () => {
  it.each(pages.slice(0, 2))("%s", async (_, __, options) => {
    watched = await openPane(options);
    const { page } = watched;
    await searchOf(page).fill("millivolts");
    await page.getByRole("option").first().click();
    await buildFormula(page, "TEMPERATURE");
    await page.getByLabel(/^emf/).fill("{4.096;8.138}");
    await page.getByLabel(/^type/).selectOption("K");
    await page.getByLabel(/^referenceTemperature/).fill("0");
    await expect.poll(() => page.locator(".outcome").textContent()).toContain("gives 99.99");
    await openView(page, "Pictures");
    await drawn(page);
    for (const view of ["Sheets", "Freeze", "Formula", "Find"]) await openView(page, view);
    await closePage(watched);
  });

  it("the local sheet", async () => {
    watched = await openSheetWithPane();
    const { page } = watched;
    await buildFormula(page, "EMF");
    await page.getByLabel(/^temperature/).fill("{100;200}");
    await page.getByLabel(/^type/).selectOption("K");
    await page.getByLabel("Goes into").fill("'Furnace log'!P8");
    await page.getByRole("button", { name: "Insert formula" }).click();
    await waitForValue(page, "'Furnace log'!P9", (value) => Number(value) > 8);
    await openView(page, "Freeze");
    await select(page, "'Furnace log'!P9");
    await page.getByRole("button", { name: "Freeze these results" }).click();
    await page.getByRole("button", { name: /^Undo/ }).waitFor();
    await openView(page, "Pictures");
    await drawn(page);
    await openView(page, "Sheets");
    await page.getByRole("button", { name: "Start this sheet: Uncertainty budget" }).click();
    await page.getByRole("button", { name: "Remove the example data" }).waitFor();
    for (const kind of ["workbook", "sheet as CSV"]) {
      await page.locator("#save").click();
      const saved = page.waitForEvent("download");
      await page
        .locator("#files")
        .getByRole("button", { name: `Save ${kind}` })
        .click();
      await saved;
    }
    await page.locator("#log-file").setInputFiles("samples/furnace-log.csv");
    await page.locator("#import").getByRole("button", { name: "Open as a new sheet" }).click();
    await page.locator("#import").getByRole("button", { name: "Go to the sheet" }).click();
    await page.locator("#log-file").setInputFiles("samples/certificate.xlsx");
    await page.getByRole("button", { name: /^Close them/ }).click();
    await expect.poll(() => page.locator("#sample-name").textContent()).toBe("certificate.xlsx");
    await closePage(watched);
  });

  it("the help page, which has no script at all", async () => {
    watched = await openPage("help.html");
    const { page, faults } = watched;
    await page.getByRole("navigation").getByRole("link", { name: "SURVEY", exact: true }).click();
    expect(new URL(page.url()).hash).toBe("#SURVEY");
    expect(await page.evaluate(() => document.scripts.length)).toBe(0);
    expect(faults).toEqual([]);
    await attempt(page, attempts["an inline script"].toString());
    await expect.poll(() => faults.join("\n")).toContain("policy violation: script-src-elem");
    expect(await page.evaluate(() => Reflect.get(window, "ran"))).toBeUndefined();
  });
});
