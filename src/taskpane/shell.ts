import type { Catalogue, CatalogueFunction } from "../catalogue/catalogue";
import { BuildView } from "./build/build-view";
import { button, make } from "./dom";
import { FindView } from "./find/find-view";
import { FreezeView } from "./freeze/freeze-view";
import type { DrawnFigure } from "./look/figure";
import { LookView } from "./look/look-view";
import { Pane } from "./pane";
import { StartView } from "./start/start-view";
import { functionPage } from "./understand/function-page";
import type { Workbook } from "./workbook/workbook";

interface View {
  readonly element: HTMLElement;
  /** When it comes into sight. */
  opened?(): Promise<void>;
  focus?(): void;
}

export type ViewName = "Find" | "Formula" | "Pictures" | "Sheets" | "Freeze";

export interface MountedPane {
  /** Gives the pane its workbook. */
  readonly connect: (workbook: Workbook) => Promise<void>;
  readonly open: (view: ViewName) => Promise<void>;
  /** Tells the pane that another workbook is open now. */
  readonly forget: () => void;
  /** The pictures that are drawn at the moment. */
  readonly drawn: () => readonly DrawnFigure[];
}

/** The whole pane: five views under one row of buttons, and a foot that says what was done. */
export function mountPane(
  container: HTMLElement,
  catalogue: Catalogue,
  { sheetExpected = false } = {},
): MountedPane {
  const pane = new Pane(sheetExpected);
  const build = new BuildView(catalogue, pane);
  const look = new LookView(catalogue, pane);
  const finding = new Finding(catalogue, (found) => {
    build.start(found);
    void open("Formula").then(() => build.focus());
  });
  const views: Readonly<Record<ViewName, View>> = {
    Find: finding,
    Formula: build,
    Pictures: look,
    Sheets: new StartView(catalogue, pane),
    Freeze: new FreezeView(catalogue, pane),
  };
  const names = Object.keys(views) as ViewName[];
  const tabs = new Map(
    names.map((name) => [name, button(name, () => void open(name).then(() => views[name].focus?.()), "tab")]),
  );
  const open = async (name: ViewName) => {
    pane.say("");
    for (const each of names) {
      views[each].element.hidden = each !== name;
      if (each === name) tabs.get(each)!.setAttribute("aria-current", "page");
      else tabs.get(each)!.removeAttribute("aria-current");
    }
    await pane.attempt(async () => views[name].opened?.());
  };
  container.classList.add("pane");
  container.append(
    make("nav", { class: "tabs", "aria-label": "Pane" }, ...tabs.values()),
    make("div", { class: "views" }, ...names.map((name) => views[name].element)),
    make(
      "p",
      { class: "general-caution" },
      "For records and analysis, never a safety interlock. Local codes and licensed practice come first.",
    ),
    pane.foot,
  );
  void open("Find");
  return {
    connect: (workbook) => pane.connect(workbook),
    open,
    forget: () => pane.forget(),
    drawn: () => look.drawn,
  };
}

/** The list and the page of the function chosen from it: one after the other, or side by side where there is room. */
class Finding implements View {
  readonly element = make("div", { class: "finding" });
  readonly #page = make("div", { class: "page-place", hidden: true });
  readonly #find: FindView;
  readonly #catalogue: Catalogue;
  readonly #build: (found: CatalogueFunction) => void;

  constructor(catalogue: Catalogue, build: (found: CatalogueFunction) => void) {
    this.#catalogue = catalogue;
    this.#build = build;
    this.#find = new FindView(catalogue, (found) => this.#open(found));
    this.#page.addEventListener("keydown", (event) => {
      if (event.key === "Escape") this.#close();
    });
    this.element.append(this.#find.element, this.#page);
  }

  focus(): void {
    if (this.#page.hidden) this.#find.focus();
    else this.#page.querySelector("h2")?.focus();
  }

  #open(found: CatalogueFunction): void {
    const page = functionPage(this.#catalogue, found, {
      build: this.#build,
      open: (other) => this.#open(other),
    });
    this.#page.replaceChildren(
      button("All functions", () => this.#close(), "quiet back"),
      page,
    );
    this.#page.hidden = false;
    this.element.classList.add("has-page");
    this.#find.mark(found.id);
    // The bare heading, so that the keyboard goes on from here; the page begins at its top.
    page.querySelector("h2")?.focus({ preventScroll: true });
    this.#page.scrollTop = 0;
    this.element.scrollIntoView({ block: "start" });
  }

  #close(): void {
    this.#page.hidden = true;
    this.element.classList.remove("has-page");
    this.#find.mark(undefined);
    this.#find.refresh();
    this.#find.focus();
  }
}
