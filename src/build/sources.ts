// Where the worksheet functions are declared, and what their JSDoc says. The order is that of src/functions/index.ts.

import { readFileSync } from "node:fs";
import { resolve } from "node:path";
import ts from "typescript";

export const root = resolve(import.meta.dirname, "../..");
const folder = resolve(root, "src/functions");

export interface DocumentedFunction {
  readonly id: string;
  readonly file: string;
  /** The text above the tags. */
  readonly description: string;
  readonly parameters: readonly {
    readonly name: string;
    readonly description: string;
    readonly optional: boolean;
  }[];
  /** Every other tag, in order; a tag may stand more than once. */
  tags(name: string): string[];
}

const parse = (file: string): ts.SourceFile =>
  ts.createSourceFile(file, readFileSync(file, "utf8"), ts.ScriptTarget.Latest, true);

/** JSDoc text without its line breaks. */
const oneLine = (text: string | ts.NodeArray<ts.JSDocComment> | undefined): string =>
  (ts.getTextOfJSDocComment(text) ?? "").replace(/\s+/g, " ").trim();

function documented(id: string, file: string): DocumentedFunction {
  const declaration = parse(file).statements.find(
    (statement): statement is ts.FunctionDeclaration =>
      ts.isFunctionDeclaration(statement) && statement.name?.text === id,
  );
  if (declaration === undefined) throw new Error(`${file} declares no function ${id}`);
  const comment = ts.getJSDocCommentsAndTags(declaration).find(ts.isJSDoc);
  const tags = ts.getJSDocTags(declaration);
  return {
    id,
    file,
    description: oneLine(comment?.comment),
    parameters: declaration.parameters.map((parameter) => {
      const tag = ts.getJSDocParameterTags(parameter)[0];
      if (tag === undefined) throw new Error(`${id}: parameter ${parameter.name.getText()} has no @param`);
      return {
        name: parameter.name.getText(),
        description: oneLine(tag.comment),
        optional: parameter.questionToken !== undefined,
      };
    }),
    // `@related`, not `@see`: the parser takes the first word after `@see` for a name of its own.
    tags: (name) => tags.filter((tag) => tag.tagName.text === name).map((tag) => oneLine(tag.comment)),
  };
}

/** Reads `export { NAME } from "./family/file"` lines. */
export function documentedFunctions(): DocumentedFunction[] {
  return parse(resolve(folder, "index.ts")).statements.flatMap((statement) => {
    if (!ts.isExportDeclaration(statement) || statement.exportClause === undefined) return [];
    if (!ts.isNamedExports(statement.exportClause) || statement.moduleSpecifier === undefined) return [];
    const file = resolve(folder, `${(statement.moduleSpecifier as ts.StringLiteral).text}.ts`);
    return statement.exportClause.elements.map(({ name }) => documented(name.text, file));
  });
}
