import { existsSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { describe, expect, it } from "vitest";
import { anchorsOf, linksOf, pathsOf } from "./links";
import { papers } from "./papers";

describe.each(papers)("$file", ({ file, text }) => {
  it("leads only to files that are there, and to headings that are in them", () => {
    const broken = linksOf(text)
      .filter((target) => !/^https?:/.test(target))
      .filter((target) => {
        const [path = "", anchor] = target.split("#");
        const to = path === "" ? file : join(dirname(file), path);
        if (!existsSync(to)) return true;
        return anchor !== undefined && !anchorsOf(readFileSync(to, "utf8")).includes(anchor);
      });
    expect(broken).toEqual([]);
  });

  it("names only paths that are there", () => {
    expect(pathsOf(text).filter((path) => !existsSync(path))).toEqual([]);
  });
});

describe("a link", () => {
  it("is found in Markdown and HTML, not in code", () => {
    const text =
      'A [b](c.md#d), ![e](f.png) <img alt="" src="g.png">\n\n[h]: i.md\n\n`[j](k)`\n\n```\n[l](m)\n```\n';
    expect(linksOf(text)).toEqual(["c.md#d", "f.png", "g.png", "i.md"]);
  });

  it("may lead to a heading by its words, and by a number where they come twice", () => {
    const text = "# A b, c\n\n## `BEAD.EMF`: 0 °C\n\n```\n# no\n```\n\n### A b, c\n";
    expect(anchorsOf(text)).toEqual(["a-b-c", "beademf-0-c", "a-b-c-1"]);
  });

  it("is a path in inline code as well", () => {
    expect(pathsOf("See `test/a.ts`, `src/b/`, `c.md` and `npm run src/d`.")).toEqual([
      "test/a.ts",
      "src/b/",
    ]);
  });
});
