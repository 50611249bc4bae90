// The last step of `npm run build`: checks the licences of all that ships, and writes the notices and the bill of
// materials beside it.

import { readFileSync, writeFileSync } from "node:fs";
import { resolve } from "node:path";
import { root } from "../sources";
import { billOfMaterials } from "./bill-of-materials";
import { notices } from "./notices";
import { isPermissive } from "./permissive";
import { shippedPackages } from "./shipped-packages";

const read = (file: string): Record<string, never> => JSON.parse(readFileSync(resolve(root, file), "utf8"));

const packages = shippedPackages();
const { name, version, license } = read("package.json");

writeFileSync(resolve(root, "dist/THIRD-PARTY-NOTICES.txt"), notices(packages));
const bill = billOfMaterials(
  { name, version, license } as never,
  packages,
  read("package-lock.json").packages as never,
);
writeFileSync(resolve(root, "dist/bill-of-materials.cdx.json"), `${JSON.stringify(bill, null, 2)}\n`);

const refused = packages.filter(({ licence }) => !isPermissive(licence));
for (const { name, version, licence } of refused)
  console.error(`${name} ${version} ships under "${licence}", which is not known to be permissive`);
if (refused.length > 0) process.exitCode = 1;
