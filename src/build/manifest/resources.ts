// The manifest's resources: each referred to by an id that exists, of the right kind and length.

import { allNamed, at, type Element, everything } from "./element";

const LONGEST_ID = 32;
const LONGEST = { ShortStrings: 125, LongStrings: 250 };

/** Ids that lead nowhere or stand twice, and resources that nothing refers to. */
export function checkReferences(root: Element): string[] {
  const faults: string[] = [];
  const resources = (at(root, "VersionOverrides", "Resources")?.children ?? []).flatMap(
    (list) => list.children,
  );
  const ids = new Set<string>();
  for (const { attributes, line } of resources) {
    const id = attributes.id ?? "";
    if (id.length < 1 || id.length > LONGEST_ID) {
      faults.push(`line ${line}: the id "${id}" must have 1 to ${LONGEST_ID} characters`);
    }
    if (ids.has(id)) faults.push(`line ${line}: the id "${id}" stands twice`);
    ids.add(id);
  }
  const used = new Set<string>();
  for (const { attributes, line, name } of everything(root)) {
    const { resid } = attributes;
    if (resid === undefined) continue;
    used.add(resid);
    if (!ids.has(resid)) faults.push(`line ${line}: <${name}> refers to "${resid}", which no resource has`);
  }
  for (const id of ids) if (!used.has(id)) faults.push(`nothing refers to the resource "${id}"`);
  return faults;
}

/** Texts longer than their kind allows, and empty ones. */
export function checkLengths(root: Element): string[] {
  const resources = at(root, "VersionOverrides", "Resources");
  const strings = (kind: "ShortStrings" | "LongStrings") =>
    (resources?.children.find((list) => list.name === kind)?.children ?? []).map((string) => ({
      string,
      longest: LONGEST[kind],
    }));
  const top = (name: string, longest: number) =>
    root.children.filter((child) => child.name === name).map((string) => ({ string, longest }));
  return [
    ...top("ProviderName", 125),
    ...top("DisplayName", 125),
    ...top("Description", 250),
    ...strings("ShortStrings"),
    ...strings("LongStrings"),
  ].flatMap(({ string, longest }) => {
    const text = string.attributes.DefaultValue ?? string.text;
    const name = string.attributes.id ?? string.name;
    return text.length >= 1 && text.length <= longest
      ? []
      : [`line ${string.line}: "${name}" has ${text.length} characters; it may have 1 to ${longest}`];
  });
}

/** Every address, wherever it stands: encrypted, and all at one origin. */
export function checkAddresses(root: Element): string[] {
  const addresses = everything(root).filter(
    ({ name, attributes }) =>
      name === "ExtendedOverrides" ||
      (attributes.DefaultValue !== undefined &&
        /^(IconUrl|HighResolutionIconUrl|SupportUrl|SourceLocation|Image|Url)$/.test(name)),
  );
  const faults: string[] = [];
  const origins = new Set<string>();
  for (const { attributes, line } of addresses) {
    const address = attributes.DefaultValue ?? attributes.Url ?? "";
    if (!URL.canParse(address)) faults.push(`line ${line}: "${address}" is not a whole address`);
    else if (!address.startsWith("https://"))
      faults.push(`line ${line}: "${address}" must begin with https://`);
    else origins.add(new URL(address).origin);
  }
  if (origins.size > 1) faults.push(`addresses lie at several origins: ${[...origins].join(", ")}`);
  return faults;
}

/** Addresses by resource id, for the checks that follow a reference. */
export function addressesById(root: Element): Map<string, string> {
  const entries = [...allNamed(root, "Url"), ...allNamed(root, "Image")];
  return new Map(entries.map(({ attributes }) => [attributes.id ?? "", attributes.DefaultValue ?? ""]));
}
