import type { Injector } from "@univerjs/core";
import { DeviceInputEventType, IEditorBridgeService } from "@univerjs/preset-sheets-core";
import { gridTheme } from "./theme";

/** Grey that can be read; the engine turns it into a light one in the dark. */
const grey = gridTheme.gray[500];

/**
 * Shows in grey, in the formula bar, the formula that fills a selected cell from elsewhere, as Excel does. The engine
 * does so by itself, but only from the first edit on (at the start it counts every cell as opened by a double click,
 * and then it hides that formula so that nobody types into it) and in a grey that in the dark is next to black.
 */
export function showFormulaOfSpill(injector: Injector): void {
  const editor = injector.get(IEditorBridgeService);
  editor.changeVisible({ ...editor.isVisible(), eventType: DeviceInputEventType.PointerDown });
  const read = editor.getLatestEditCellState.bind(editor);
  editor.getLatestEditCellState = () => {
    const state = read();
    const runs = state?.isInArrayFormulaRange
      ? state.documentLayoutObject.documentModel?.getBody()?.textRuns
      : [];
    for (const run of runs ?? []) run.ts = { ...run.ts, cl: { rgb: grey } };
    return state;
  };
}
