import { make } from "../../taskpane/dom";
import type { Figure } from "../../taskpane/look/figure";

/**
 * A picture of the pane drawn anew for paper: in the colours of the paper, which the pane in the dark does not have,
 * and as an image, which a page of any width can hold.
 */
export async function printedPicture(figure: Figure, paper: HTMLElement): Promise<HTMLElement> {
  const { draw } = await import(/* webpackChunkName: "picture" */ "../../taskpane/look/draw");
  const place = paper.appendChild(make("div", { class: "print-drawing" }));
  const drawing = draw(place, figure);
  // The plotting library draws after this turn of the page.
  await new Promise((resolve) => setTimeout(resolve));
  const image = make("img", { src: drawing.canvas.toDataURL("image/png"), alt: figure.title });
  drawing.end();
  place.remove();
  return make("figure", { class: "print-picture" }, make("figcaption", {}, figure.title), image);
}
