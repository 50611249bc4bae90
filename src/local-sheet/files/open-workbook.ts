import { type ParseXml, readWorkbook, type XmlNode } from "../../workbooks";
import type { FileDialog } from "./dialog";
import { fileWorkbook } from "./sheet-data";

type WorkbookData = ReturnType<typeof fileWorkbook>;

export interface Opening {
  hasOwnWork: () => Promise<boolean>;
  open: (data: WorkbookData, fileName: string) => void;
}

/** The browser's parser fetches nothing and runs nothing; a fault shows as an element of its own. */
const parseXml: ParseXml = (text) => {
  const document = new DOMParser().parseFromString(text, "application/xml");
  if (document.querySelector("parsererror"))
    throw new Error("it is damaged: a part of it is not well-formed");
  return document.documentElement as unknown as XmlNode;
};

const maxBytes = 100_000_000;

/** Opens a workbook file (.xlsx) in place of the open sheets. Asks before own work is lost. */
export async function openWorkbookFile(
  file: File,
  dialog: FileDialog,
  { hasOwnWork, open }: Opening,
): Promise<void> {
  await dialog.busy(`Reading ${file.name}…`);
  let data: WorkbookData;
  let leftOut: string[];
  try {
    if (file.size > maxBytes) throw new Error("it is larger than 100 MB");
    const read = readWorkbook(new Uint8Array(await file.arrayBuffer()), parseXml);
    data = fileWorkbook(read.sheets);
    leftOut = read.leftOut;
  } catch (failure) {
    const reason = failure instanceof Error ? failure.message : String(failure);
    dialog.show(
      `${file.name} was not opened`,
      [`The file cannot be opened: ${reason}. Your sheets are still open.`],
      [{ words: "Close", primary: true }],
    );
    return;
  }
  const act = () => {
    open(data, file.name);
    if (leftOut.length === 0) dialog.close();
    else {
      dialog.show(
        `${file.name} is open`,
        [`This sheet does not know everything that the file holds. Left out: ${leftOut.join(", ")}.`],
        [{ words: "Close", primary: true }],
      );
    }
  };
  if (!(await hasOwnWork())) act();
  else {
    dialog.show(
      "Close your sheets?",
      [
        `You have worked on the open sheets. “${file.name}” opens in their place, and nothing of them is kept.`,
      ],
      [
        { words: "Close them and open the file", act },
        { words: "Keep my sheets", primary: true },
      ],
    );
  }
}

/** By its first bytes, which no text has: an archive, or an old workbook, which is refused with a reason. */
export async function looksLikeWorkbook(file: File): Promise<boolean> {
  const [first, second] = new Uint8Array(await file.slice(0, 2).arrayBuffer());
  return (first === 0x50 && second === 0x4b) || (first === 0xd0 && second === 0xcf);
}
