// One page for everything: the functions, the button and the pane share a runtime only when each refers to the
// same resource. And no host is shut out by asking for more than the functions use.

import { allNamed, at, type Element } from "./element";

/** The most that may be asked of the host: later sets shut out volume-licensed Excel 2021. */
const HIGHEST_SETS: Record<string, string> = { CustomFunctionsRuntime: "1.3", SharedRuntime: "1.1" };
const NAMESPACE = "BEAD";

/** [MS-OWEMXML]: by this name a workbook that refers to the add-in asks for its pane, and there may be one. */
const OPENED_BY_WORKBOOKS = "Office.AutoShowTaskpaneWithDocument";

export function checkRuntime(root: Element): string[] {
  const runtime = allNamed(root, "Runtime")[0];
  const page = runtime?.attributes.resid;
  const host = at(root, "VersionOverrides", "Hosts", "Host");
  const faults: string[] = [];
  if (runtime?.attributes.lifetime !== "long") faults.push('the <Runtime> needs lifetime="long"');
  const sharers: [string, Element | undefined][] = [
    ["Page", host && at(host, "AllFormFactors", "ExtensionPoint", "Page", "SourceLocation")],
    ["FunctionFile", host && at(host, "DesktopFormFactor", "FunctionFile")],
    ...allNamed(root, "Action")
      .filter(({ attributes }) => attributes["xsi:type"] === "ShowTaskpane")
      .map((action): [string, Element | undefined] => ["ShowTaskpane", at(action, "SourceLocation")]),
  ];
  for (const [name, element] of sharers) {
    const resid = element?.attributes.resid;
    if (resid !== page)
      faults.push(`<${name}> refers to "${resid}", the runtime to "${page}": they must share one`);
  }
  const panes = allNamed(root, "TaskpaneId").map(({ text }) => text);
  if (panes.join() !== OPENED_BY_WORKBOOKS)
    faults.push(`the pane is named "${panes}"; workbooks ask for ${OPENED_BY_WORKBOOKS}`);
  return [...faults, ...checkSets(root), ...checkNamespace(root)];
}

function checkSets(root: Element): string[] {
  const sets = at(root, "Requirements", "Sets")?.children ?? [];
  const asked = new Map(sets.map(({ attributes }) => [attributes.Name ?? "", attributes.MinVersion ?? ""]));
  const faults: string[] = [];
  for (const [name, version] of asked) {
    const highest = HIGHEST_SETS[name];
    if (highest === undefined) faults.push(`the requirement set ${name} is not one the functions use`);
    else if (!/^1\.\d+$/.test(version) || minor(version) > minor(highest)) {
      faults.push(`${name} ${version} is asked for; ${highest} is the most that may be`);
    }
  }
  for (const name of Object.keys(HIGHEST_SETS)) {
    if (!asked.has(name)) faults.push(`the requirement set ${name} is not asked for`);
  }
  return faults;
}

const minor = (version: string) => Number(version.split(".")[1]);

function checkNamespace(root: Element): string[] {
  const resid = allNamed(root, "Namespace")[0]?.attributes.resid;
  const text = allNamed(root, "String").find(({ attributes }) => attributes.id === resid)?.attributes
    .DefaultValue;
  return text === NAMESPACE ? [] : [`the namespace is "${text}"; formulas in workbooks say ${NAMESPACE}`];
}
