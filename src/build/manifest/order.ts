// The spreadsheet reads a manifest by a schema of sequences: the right element in the wrong place makes it
// refuse the whole file. These are the sequences of the elements that this manifest uses, from [MS-OWEMXML].

import { type Element, everything } from "./element";

interface Sequence {
  children: string[];
  required: string[];
}

const sequence = (children: string, required = ""): Sequence => ({
  children: words(children),
  required: words(required),
});
const words = (text: string) => text.split(" ").filter((word) => word !== "");

/** By element name, and by name and xsi:type where the type decides. */
const SEQUENCES: Record<string, Sequence> = {
  OfficeApp: sequence(
    "Id AlternateId Version ProviderName DefaultLocale DisplayName Description IconUrl HighResolutionIconUrl " +
      "SupportUrl AppDomains Hosts Requirements DefaultSettings Permissions Dictionary VersionOverrides ExtendedOverrides",
    "Id Version ProviderName DefaultLocale DisplayName Description IconUrl HighResolutionIconUrl SupportUrl " +
      "Hosts Requirements DefaultSettings Permissions VersionOverrides",
  ),
  Requirements: sequence("Sets Methods", "Sets"),
  DefaultSettings: sequence("SourceLocation", "SourceLocation"),
  VersionOverrides: sequence(
    "Description Requirements Hosts Resources WebApplicationInfo",
    "Hosts Resources",
  ),
  "Host Workbook": sequence(
    "Runtimes AllFormFactors DesktopFormFactor",
    "Runtimes AllFormFactors DesktopFormFactor",
  ),
  Runtimes: sequence("Runtime", "Runtime"),
  AllFormFactors: sequence("ExtensionPoint", "ExtensionPoint"),
  DesktopFormFactor: sequence("GetStarted FunctionFile ExtensionPoint", "FunctionFile ExtensionPoint"),
  GetStarted: sequence("Title Description LearnMoreUrl", "Title Description LearnMoreUrl"),
  "ExtensionPoint CustomFunctions": sequence(
    "Script Page Metadata Namespace",
    "Script Page Metadata Namespace",
  ),
  "ExtensionPoint PrimaryCommandSurface": sequence("OfficeTab CustomTab"),
  "ExtensionPoint ContextMenu": sequence("OfficeMenu", "OfficeMenu"),
  OfficeMenu: sequence("Control", "Control"),
  OfficeTab: sequence("Group", "Group"),
  Group: sequence("Label Icon Control", "Label Icon Control"),
  "Control Button": sequence("Label Supertip Icon Action", "Label Supertip Icon Action"),
  Supertip: sequence("Title Description", "Title Description"),
  "Action ShowTaskpane": sequence("TaskpaneId SourceLocation Title", "SourceLocation"),
  "Action ExecuteFunction": sequence("FunctionName", "FunctionName"),
  Resources: sequence("Images Urls ShortStrings LongStrings", "Images Urls ShortStrings LongStrings"),
};

/** Every child that stands out of place, is not known there, or is missing. */
export function checkOrder(root: Element): string[] {
  return everything(root).flatMap((element) => {
    const type = element.attributes["xsi:type"];
    const rule = SEQUENCES[`${element.name} ${type}`] ?? SEQUENCES[element.name];
    return rule === undefined ? [] : checkChildren(element, rule);
  });
}

function checkChildren(parent: Element, { children, required }: Sequence): string[] {
  const faults: string[] = [];
  let reached = 0;
  for (const child of parent.children) {
    const place = children.indexOf(child.name);
    if (place < 0) {
      faults.push(`line ${child.line}: <${child.name}> is not known in <${parent.name}>`);
    } else if (place < reached) {
      faults.push(`line ${child.line}: <${child.name}> must stand before <${children[reached]}>`);
    } else reached = place;
  }
  for (const name of required) {
    if (!parent.children.some((child) => child.name === name)) {
      faults.push(`line ${parent.line}: <${parent.name}> needs <${name}>`);
    }
  }
  return faults;
}
