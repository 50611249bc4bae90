import type { Workbook } from "./workbook";

/**
 * The line above the grid: for a selected cell with an error what went wrong, in words. Excel shows the same
 * message in the cell's error menu; the grid engine shows none.
 */
export function showMessages(line: HTMLElement, workbook: Workbook): void {
  const update = async () => {
    const selection = await workbook.getSelection();
    const cell = selection.slice(selection.lastIndexOf("!") + 1).split(":")[0] ?? "";
    if (!/^[A-Z]+\d+$/.test(cell)) return;
    const [message, text] = await Promise.all([workbook.getErrorMessage(cell), workbook.getText(cell)]);
    const parts = message ? [part("code", `${text}:`), part("words", message)] : [part("hint", hint)];
    const next = [part("cell", cell), ...parts];
    // Written only when it differs: a live region is read aloud at each change.
    if (next.map((each) => each.textContent).join("") !== line.textContent) line.replaceChildren(...next);
  };
  workbook.onChange(() => void update());
  void update();
}

const hint = "Type =BEAD. in a cell and the functions are offered.";

function part(role: string, text: string): HTMLElement {
  const span = document.createElement("span");
  span.className = role;
  span.textContent = text;
  return span;
}
