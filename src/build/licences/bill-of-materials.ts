// A CycloneDX bill of materials of what ships: not of what helped to build it.

import type { ShippedPackage } from "./shipped-packages";

interface LockedPackage {
  readonly integrity?: string;
}

/** In a lock file: sha512-<base64>. In the bill: hexadecimal. */
function hashes(integrity: string | undefined): { alg: string; content: string }[] {
  const digest = /^sha512-(.+)$/.exec(integrity ?? "")?.[1];
  return digest === undefined
    ? []
    : [{ alg: "SHA-512", content: Buffer.from(digest, "base64").toString("hex") }];
}

const address = (name: string, version: string): string => `pkg:npm/${name.replace("@", "%40")}@${version}`;

export function billOfMaterials(
  product: { readonly name: string; readonly version: string; readonly license: string },
  packages: readonly ShippedPackage[],
  locked: Readonly<Record<string, LockedPackage>>,
): object {
  const reference = address(product.name, product.version);
  const components = packages.map(({ name, version, licence, folder }) => ({
    type: "library",
    "bom-ref": `${address(name, version)}#${folder}`,
    name,
    version,
    purl: address(name, version),
    licenses: [{ expression: licence }],
    hashes: hashes(locked[folder]?.integrity),
  }));
  return {
    $schema: "http://cyclonedx.org/schema/bom-1.5.schema.json",
    bomFormat: "CycloneDX",
    specVersion: "1.5",
    version: 1,
    metadata: {
      component: {
        type: "application",
        "bom-ref": reference,
        name: product.name,
        version: product.version,
        purl: reference,
        licenses: [{ expression: product.license }],
      },
    },
    components,
    dependencies: [{ ref: reference, dependsOn: components.map((one) => one["bom-ref"]) }],
  };
}
