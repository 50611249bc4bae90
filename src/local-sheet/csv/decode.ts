/** A log's bytes as text. Loggers write UTF-8, UTF-16 (with a mark) or the Western code page: "°" tells. */
export interface DecodedText {
  text: string;
  characters: "UTF-8" | "UTF-16" | "Windows-1252";
}

export function decode(bytes: Uint8Array): DecodedText {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) {
    return { text: new TextDecoder("utf-16le").decode(bytes), characters: "UTF-16" };
  }
  if (bytes[0] === 0xfe && bytes[1] === 0xff) {
    return { text: new TextDecoder("utf-16be").decode(bytes), characters: "UTF-16" };
  }
  try {
    return { text: new TextDecoder("utf-8", { fatal: true }).decode(bytes), characters: "UTF-8" };
  } catch {
    return { text: new TextDecoder("windows-1252").decode(bytes), characters: "Windows-1252" };
  }
}

/** A file that is no text at all: a workbook, an archive, a picture. */
export const isBinary = ({ text }: DecodedText): boolean => text.slice(0, 4096).includes("\0");
