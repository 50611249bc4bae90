import { writeWorkbook } from "../../workbooks";
import type { Grid } from "../grid";
import { csvText } from "./csv-text";
import type { FileDialog } from "./dialog";
import { download, fileName } from "./download";
import { gridSheets } from "./grid-sheets";

const workbookType = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";

/** So that Excel reads "°" as it is. */
const byteOrderMark = "\ufeff";

export interface Saving {
  /** The open file's or sample's. */
  name: () => string;
  /** Takes over what is being typed. */
  settle: () => Promise<unknown>;
  saved: () => void;
}

/** Offers the open sheets as a workbook file, and the sheet in front as CSV. */
export function offerSaving(grid: Grid, dialog: FileDialog, { name, settle, saved }: Saving): void {
  const save = (work: () => void) => async () => {
    try {
      await settle();
      work();
      dialog.close();
    } catch (failure) {
      const reason = failure instanceof Error ? failure.message : String(failure);
      dialog.show(
        "Nothing was saved",
        [`The file could not be made: ${reason}.`],
        [{ words: "Close", primary: true }],
      );
    }
  };
  const workbook = save(() => {
    const title = name();
    const bytes = writeWorkbook({ title, sheets: gridSheets(grid) });
    download(fileName(title, "xlsx"), new Uint8Array(bytes), workbookType);
    saved();
  });
  const csv = save(() => {
    const front = grid.api.getActiveWorkbook()?.getActiveSheet().getSheetName();
    const sheet = gridSheets(grid).find((each) => each.name === front);
    if (!sheet) throw new Error("no sheet is open");
    download(fileName(sheet.name, "csv"), byteOrderMark + csvText(sheet), "text/csv;charset=utf-8");
  });
  dialog.show(
    "Save",
    [
      "All sheets as an Excel workbook (.xlsx): formulas, results and formats. Excel needs the add-in to calculate them anew.",
      "Or the sheet in front as CSV: values alone. A text that begins like a formula gets an apostrophe in front, so that no program runs it.",
      "The file is made in this page and goes to your downloads; nothing is sent anywhere.",
    ],
    [
      { words: "Save workbook", primary: true, act: workbook },
      { words: "Save sheet as CSV", act: csv },
      { words: "Cancel" },
    ],
  );
}
