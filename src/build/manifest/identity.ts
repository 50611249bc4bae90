// Who the add-in is: a fixed GUID, and the version of package.json.

import { at, type Element } from "./element";

const GUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[1-5][0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/i;

/** Workbooks in the field refer to the add-in by this Id: a new one would orphan their formulas. */
export const FIXED_ID = "1f6f0a57-3c0b-4a4e-9d52-6b7e5c94d2a8";

export function checkIdentity(root: Element, packageVersion: string): string[] {
  const faults: string[] = [];
  const id = at(root, "Id")?.text ?? "";
  if (!GUID.test(id)) faults.push(`the Id "${id}" is not a GUID`);
  else if (id.toLowerCase() !== FIXED_ID) faults.push(`the Id is ${id}, but workbooks know ${FIXED_ID}`);
  const version = at(root, "Version")?.text ?? "";
  const expected = `${packageVersion}.0`;
  if (version !== expected) faults.push(`the Version is ${version}; package.json asks for ${expected}`);
  return faults;
}
