/** Keys pressed in here are not meant for the grid, which listens on the whole page. */
export function keepKeys(place: HTMLElement): void {
  for (const kind of ["keydown", "keypress", "keyup", "paste", "copy", "cut"]) {
    place.addEventListener(kind, (event) => event.stopPropagation());
  }
}
