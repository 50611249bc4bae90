// Which licences may ship: those that ask for no more than their text and the names of the authors.

const PERMISSIVE: ReadonlySet<string> = new Set([
  "0BSD",
  "Apache-2.0",
  "BlueOak-1.0.0",
  "BSD-2-Clause",
  "BSD-3-Clause",
  "CC0-1.0",
  "ISC",
  "MIT",
  "MIT-0",
  "Unlicense",
  "Zlib",
]);

/**
 * Whether an SPDX expression of licences, AND, OR and brackets leaves a permissive way. AND binds closer than OR.
 * Anything else (an exception, a file's name, nothing at all) is for a person to read, and does not.
 */
export function isPermissive(expression: string): boolean {
  const tokens = expression.match(/\(|\)|[^\s()]+/g) ?? [];
  let at = 0;
  const one = (): boolean => {
    const token = tokens[at++];
    if (token !== "(") return token !== undefined && PERMISSIVE.has(token);
    const inner = either();
    return tokens[at++] === ")" && inner;
  };
  const both = (): boolean => {
    let permissive = one();
    while (tokens[at] === "AND") {
      at++;
      permissive = one() && permissive;
    }
    return permissive;
  };
  const either = (): boolean => {
    let permissive = both();
    while (tokens[at] === "OR") {
      at++;
      permissive = both() || permissive;
    }
    return permissive;
  };
  const permissive = either();
  return permissive && at === tokens.length;
}
