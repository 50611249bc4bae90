/** Hands a file to the browser to keep. Nothing is sent: the page makes it and the browser stores it. */
export function download(name: string, content: BlobPart, type: string): void {
  const address = URL.createObjectURL(new Blob([content], { type }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  // Later, because the browser reads it after the click has returned.
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}

/** A name that every system takes. */
export const fileName = (name: string, ending: string): string =>
  `${
    name
      .replace(/\.(csv|txt|tsv|xlsx|json)$/i, "")
      .replace(/[\\/:*?"<>|\p{Cc}]/gu, " ")
      .trim()
      .slice(0, 100) || "Beadline"
  }.${ending}`;
