import type { Catalogue } from "../catalogue/catalogue";
import { decode, isBinary } from "./csv/decode";
import { ImportDialog } from "./csv/import-dialog";
import { looksLikeWorkbook } from "./files";
import type { Workbook } from "./workbook";

/** A browser keeps a file and its table in memory together; beyond this it ends the page instead of answering. */
const maxBytes = 200_000_000;

/** From here on reading takes long enough to say so. */
const slowBytes = 2_000_000;

/** Opens logs and workbooks by the button and by drop anywhere on the page; logs lead to the same dialog. */
export function openLogs(
  workbook: Workbook,
  catalogue: Catalogue,
  onOpened: (name: string) => void,
  openWorkbook: (file: File) => Promise<void>,
): void {
  const input = document.getElementById("log-file") as HTMLInputElement;
  const dialog = new ImportDialog(
    document.getElementById("import") as HTMLDialogElement,
    workbook,
    catalogue,
    onOpened,
  );
  const open = async (file: File | undefined) => {
    if (!file) return;
    if (await looksLikeWorkbook(file)) return openWorkbook(file);
    if (file.size > slowBytes) await dialog.wait(`Reading ${file.name}…`);
    const decoded = file.size > maxBytes ? undefined : decode(new Uint8Array(await file.arrayBuffer()));
    const refusal = decoded ? refusalOf(decoded) : "it is larger than 200 MB. Split the log into parts.";
    if (decoded && !refusal) dialog.show(file.name, decoded);
    else dialog.refuse(file.name, refusal ?? "");
  };
  document.getElementById("open-log")?.addEventListener("click", () => input.click());
  input.addEventListener("change", () => {
    void open(input.files?.[0]);
    // So that the same file can be chosen again after a correction.
    input.value = "";
  });
  acceptDrops(document.getElementById("drop-note")!, (file) => void open(file));
}

function refusalOf(decoded: ReturnType<typeof decode>): string | undefined {
  if (isBinary(decoded)) return "it is not a text file. Save the log as CSV first.";
  if (decoded.text.trim() === "") return "it is empty.";
  return undefined;
}

/** Without `preventDefault` the browser would leave the page and show the dropped file itself. */
function acceptDrops(note: HTMLElement, open: (file: File | undefined) => void): void {
  const carriesFile = (event: DragEvent) => event.dataTransfer?.types.includes("Files") ?? false;
  document.addEventListener("dragover", (event) => {
    if (!carriesFile(event)) return;
    event.preventDefault();
    note.hidden = false;
  });
  document.addEventListener("dragleave", (event) => {
    if (!event.relatedTarget) note.hidden = true;
  });
  document.addEventListener(
    "drop",
    (event) => {
      note.hidden = true;
      if (!carriesFile(event)) return;
      event.preventDefault();
      // The grid has its own idea of a dropped file.
      event.stopPropagation();
      open(event.dataTransfer?.files[0]);
    },
    true,
  );
}
