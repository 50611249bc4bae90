/**
 * No script of ours makes code or markup out of texts. The packages of the grid do in a few places, each named here
 * with the reason why nothing can come of it; what the browser refuses besides is in test/browser/policy.test.ts.
 */
import { readdirSync, readFileSync } from "node:fs";
import { transformSync } from "esbuild";
import { describe, expect, it } from "vitest";
import { countDynamicWords, type DynamicWord } from "./dynamic-words";

type Found = Partial<Record<DynamicWord, number>>;

/** What stands in the files of packages that were bundled, and why it is harmless. A change must be looked at. */
const known: Readonly<Record<string, { found: Found; why: string }>> = {
  "lodash-es/_root.js": {
    found: { Function: 1 },
    why: "asks for the global object where the browser has neither `global` nor `self`; every browser has `self`",
  },
  "@univerjs/sheets-formula/lib/es/index.js": {
    found: { Function: 2 },
    why: "functions that arrive as source text from another thread; we register functions as functions, and have no such thread",
  },
  "@univerjs/rpc/lib/es/index.js": {
    found: { Worker: 1 },
    why: "the other thread itself, which is not switched on; the policy has no worker-src and falls back on script-src 'self'",
  },
  "fflate/esm/browser.js": {
    found: { Worker: 1 },
    why: "packing in another thread; we call the functions that pack in this one, and a script from a blob is refused",
  },
  "@univerjs/docs-ui/lib/es/index.js": {
    found: { "innerHTML =": 1, "parsing as text/html": 2 },
    why: "empties the hidden field of the cell editor; what is pasted is parsed in a document of its own, which runs and loads nothing",
  },
  "@univerjs/ui/lib/es/index.js": {
    found: { "innerHTML =": 1, "parsing as text/html": 2, "javascript:": 1 },
    why: "copies cells in browsers without a clipboard for pages, each text escaped before; strips what is pasted, `javascript:` among it",
  },
  "@univerjs/sheets-ui/lib/es/index.js": {
    found: { createContextualFragment: 1 },
    why: "takes pasted markup apart in a document of its own, which runs and loads nothing, and strips it",
  },
  "react-dom/cjs/react-dom-client.production.js": {
    found: { "innerHTML =": 3, "javascript:": 3, dangerouslySetInnerHTML: 13 },
    why: "an empty script element, and markup that a component asks for by `dangerouslySetInnerHTML`: none does; `javascript:` addresses are refused",
  },
};

const scripts = readdirSync("dist").filter((file) => file.endsWith(".js"));

/** A script without its comments. */
const bare = (file: string): string =>
  transformSync(readFileSync(file, "utf8"), {
    loader: file.endsWith(".ts") ? "ts" : "js",
    minifyWhitespace: true,
    legalComments: "none",
  }).code;

describe("our own sources", () => {
  const sources = readdirSync("src", { recursive: true, encoding: "utf8" });

  it("make no code and no markup out of texts", () => {
    const files = sources.filter((file) => file.endsWith(".ts") && !file.endsWith(".d.ts"));
    expect(files.length).toBeGreaterThan(300);
    const found = files
      .map((file) => ({ file, found: countDynamicWords(bare(`src/${file}`)) }))
      .filter(({ found }) => Object.keys(found).length > 0);
    expect(found).toEqual([]);
  });

  it("hold no script, no style and no handler inside a page", () => {
    const pages = sources.filter((file) => file.endsWith(".html"));
    expect(pages.length).toBe(3);
    for (const file of pages) {
      const page = readFileSync(`src/${file}`, "utf8").replace(/<!--[\s\S]*?-->/g, "");
      expect(
        page.match(/<script(?![^>]*\bsrc=)|<style|<[^>]*\s(?:on\w+|style)\s*=|javascript:/gi),
      ).toBeNull();
    }
  });
});

describe("what was bundled", () => {
  const bundled: string[] = ["functions", "pages"].flatMap((name) =>
    JSON.parse(readFileSync(`.cache/bundled/${name}.json`, "utf8")),
  );

  it("makes code or markup out of texts only where it is known to, and harmless", () => {
    const found = Object.fromEntries(
      bundled
        .filter((file) => /\.[cm]?js$/.test(file))
        .map((file) => [file.replace("node_modules/", ""), countDynamicWords(bare(file))] as const)
        .filter(([, words]) => Object.keys(words).length > 0),
    );
    expect(found).toEqual(
      Object.fromEntries(Object.entries(known).map(([file, each]) => [file, each.found])),
    );
  });

  it("reaches the page of the grid alone, and is no more there than in the packages", () => {
    const perhaps: Found = {};
    for (const { found } of Object.values(known)) {
      for (const [word, count] of Object.entries(found) as [DynamicWord, number][]) {
        perhaps[word] = (perhaps[word] ?? 0) + count;
      }
    }
    expect(scripts).toContain("functions.js");
    for (const script of scripts) {
      const found = countDynamicWords(readFileSync(`dist/${script}`, "utf8"));
      if (script === "sheet.js") expect(found).toEqual(perhaps);
      else expect({ script, found }).toEqual({ script, found: {} });
    }
  });
});

describe("the words", () => {
  it.each([
    "eval('1')",
    "(0,eval) ( x)",
    "new Function('a')",
    "Function(`return 1`)",
    "setTimeout('x()',1)",
    "a.innerHTML=b",
    "a.outerHTML = b",
    "a.insertAdjacentHTML('beforeend',b)",
    "document.writeln(a)",
    "new DOMParser().parseFromString(a,'text/html')",
    "frame.srcdoc=a",
    "new Worker(a)",
  ])("find %s", (script) => {
    expect(Object.keys(countDynamicWords(script))).toHaveLength(1);
  });

  it("leave alone what only looks like it", () => {
    for (const script of ["medieval(1)", "a.innerHTML==b", "setTimeout(f,1)", "Function()", "retrieval (x)"])
      expect(countDynamicWords(script)).toEqual({});
  });
});
