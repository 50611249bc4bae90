import type { CellLook } from "../content";
import { attribute, children, count, down, isOn, type XmlNode } from "./xml-node";

/** The formats that files name by number alone, in their English form. */
const known: Record<number, string> = {
  1: "0",
  2: "0.00",
  3: "#,##0",
  4: "#,##0.00",
  9: "0%",
  10: "0.00%",
  11: "0.00E+00",
  12: "# ?/?",
  13: "# ??/??",
  14: "yyyy-mm-dd",
  15: "d-mmm-yy",
  16: "d-mmm",
  17: "mmm-yy",
  18: "h:mm AM/PM",
  19: "h:mm:ss AM/PM",
  20: "h:mm",
  21: "h:mm:ss",
  22: "yyyy-mm-dd hh:mm",
  37: "#,##0;-#,##0",
  38: "#,##0;-#,##0",
  39: "#,##0.00;-#,##0.00",
  40: "#,##0.00;-#,##0.00",
  45: "mm:ss",
  46: "[h]:mm:ss",
  47: "mm:ss.0",
  48: "##0.0E+0",
  49: "@",
};

/** The looks that cells refer to by number. Colours of a theme are left to the sheet's own. */
export function readLooks(root: XmlNode | undefined): CellLook[] {
  const formats = new Map(
    [...children(down(root, "numFmts"), "numFmt")].map((format) => [
      count(format, "numFmtId", -1),
      attribute(format, "formatCode") ?? "",
    ]),
  );
  const fonts = [...children(down(root, "fonts"), "font")].map(readFont);
  return [...children(down(root, "cellXfs"), "xf")].map((look) => {
    const id = count(look, "numFmtId", 0);
    const pattern = formats.get(id) ?? known[id];
    return {
      ...fonts[count(look, "fontId", 0)],
      ...(pattern && pattern !== "General" ? { pattern } : {}),
      ...readAlignment(down(look, "alignment")),
    };
  });
}

function readFont(font: XmlNode): CellLook {
  const bold = down(font, "b");
  const size = Number(attribute(down(font, "sz"), "val"));
  const colour = /^(?:[0-9a-f]{2})?([0-9a-f]{6})$/i.exec(attribute(down(font, "color"), "rgb") ?? "")?.[1];
  return {
    ...(bold && isOn(attribute(bold, "val") ?? "1") ? { bold: true } : {}),
    ...(size > 0 && size !== 11 ? { size } : {}),
    ...(colour ? { colour: colour.toLowerCase() } : {}),
  };
}

function readAlignment(alignment: XmlNode | undefined): CellLook {
  const align = attribute(alignment, "horizontal");
  return {
    ...(align === "left" || align === "right" || align === "center" ? { align } : {}),
    ...(count(alignment, "indent", 0) > 0 ? { indented: true } : {}),
    ...(isOn(attribute(alignment, "wrapText")) ? { wrapped: true } : {}),
  };
}
