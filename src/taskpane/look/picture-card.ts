import { button, make } from "../dom";
import type { Pane } from "../pane";
import { copyImage } from "./copy-image";
import type { Drawing } from "./draw";
import type { Figure } from "./figure";
import { figureTable } from "./figure-table";

/** A picture with its finding above and its numbers beneath; the plotting library comes with the first one drawn. */
export class PictureCard {
  readonly element = make("figure", { class: "picture", hidden: true });
  readonly #pane: Pane;
  readonly #title = make("figcaption", { role: "status" });
  readonly #place = make("div", { class: "plot", role: "img" });
  readonly #more = make("div", { class: "numbers" });
  #drawing: Drawing | undefined;
  #figure: Figure | undefined;

  constructor(pane: Pane) {
    this.#pane = pane;
    const copy = button("Copy as image", () => void pane.attempt(() => this.#copy()));
    this.element.append(this.#title, this.#place, make("div", { class: "pane-buttons" }, copy), this.#more);
    for (const query of ["(prefers-color-scheme: dark)", "(forced-colors: active)"]) {
      matchMedia(query).addEventListener("change", () => void this.#draw());
    }
  }

  /** What is to be seen here; undefined while nothing is drawn. */
  get figure(): Figure | undefined {
    return this.#figure;
  }

  async show(figure: Figure, ...beneath: HTMLElement[]): Promise<void> {
    this.#figure = figure;
    this.element.hidden = false;
    if (this.#title.textContent !== figure.title) this.#title.textContent = figure.title;
    this.#place.setAttribute("aria-label", `${figure.title}. The numbers stand in the table beneath.`);
    this.#more.replaceChildren(
      ...beneath,
      make("details", {}, make("summary", {}, "The numbers as a table"), figureTable(figure)),
    );
    await this.#draw();
  }

  hide(): void {
    this.element.hidden = true;
    this.#figure = undefined;
  }

  async #draw(): Promise<void> {
    try {
      const { draw } = await import(/* webpackChunkName: "picture" */ "./draw");
      const figure = this.#figure;
      if (!figure) return;
      this.#drawing?.end();
      this.#drawing = draw(this.#place, figure);
    } catch {
      this.#drawing = undefined;
      this.#pane.say("The picture cannot be drawn here. Its numbers stand in the table beneath.", true);
    }
  }

  async #copy(): Promise<void> {
    if (!this.#drawing || !this.#figure) return;
    const done = await copyImage(this.#drawing.canvas, this.#figure.title);
    this.#pane.say(
      done === "copied"
        ? "The picture is on the clipboard."
        : "The clipboard takes no pictures here; it is saved as a file.",
    );
  }
}
