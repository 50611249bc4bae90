// THIRD-PARTY-NOTICES.txt: who made what ships with us, and on which terms.

import type { ShippedPackage } from "./shipped-packages";

const RULE = "=".repeat(72);

/** One text for all packages that carry the same one. */
export function notices(packages: readonly ShippedPackage[]): string {
  const byText = new Map<string, ShippedPackage[]>();
  for (const one of packages) {
    const text = one.texts.join("\n\n") || `${one.name} carries no licence file; it declares ${one.licence}.`;
    byText.set(text, [...(byText.get(text) ?? []), one]);
  }
  const parts = [...byText].map(
    ([text, sharing]) =>
      `${RULE}\n${sharing.map(({ name, version, licence }) => `${name} ${version}, ${licence}`).join("\n")}\n\n${text}\n`,
  );
  return `The pages of Beadline contain code of ${packages.length} packages. functions.js contains none but its bundler's
start-up code. These are their names and the terms on which they are shared.

${parts.join("\n")}`;
}
