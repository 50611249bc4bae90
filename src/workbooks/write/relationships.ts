import { element, part } from "../xml";

/** The part that says which other parts one part leads to, numbered in their order. */
export const relationships = (list: readonly (readonly [target: string, type: string])[]): string =>
  part(
    element(
      "Relationships",
      { xmlns: "http://schemas.openxmlformats.org/package/2006/relationships" },
      ...list.map(([Target, Type], index) =>
        element("Relationship", { Id: `rId${index + 1}`, Type, Target }),
      ),
    ),
  );
