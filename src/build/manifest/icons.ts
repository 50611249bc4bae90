// Each icon that the manifest names must lie among the assets, at the size it is shown at.

import { imageSize } from "../png";
import { allNamed, at, type Element } from "./element";
import { addressesById } from "./resources";

/** Gives the content of a file under the hosted root, such as "assets/icon-16.png"; undefined when there is none. */
export type ReadAsset = (path: string) => Uint8Array | undefined;

const EVERY_ICON_LIST_HAS = [16, 32, 80];

export function checkIcons(root: Element, read: ReadAsset): string[] {
  const addresses = addressesById(root);
  const lists = allNamed(root, "Icon").map((icon) => checkList(icon));
  const listed = allNamed(root, "Icon").flatMap((icon) =>
    icon.children.map(({ attributes, line }) =>
      checkFile(addresses.get(attributes.resid ?? ""), Number(attributes.size), line, read),
    ),
  );
  const top = [
    { icon: at(root, "IconUrl"), size: 32 },
    { icon: at(root, "HighResolutionIconUrl"), size: 64 },
  ].map(({ icon, size }) => checkFile(icon?.attributes.DefaultValue, size, icon?.line ?? 0, read));
  return [...lists, ...listed, ...top].flat();
}

function checkList(icon: Element): string[] {
  const sizes = icon.children.map(({ attributes }) => Number(attributes.size));
  return EVERY_ICON_LIST_HAS.filter((size) => !sizes.includes(size)).map(
    (size) => `line ${icon.line}: <Icon> needs an image of ${size} pixels`,
  );
}

function checkFile(address: string | undefined, size: number, line: number, read: ReadAsset): string[] {
  if (address === undefined || !URL.canParse(address)) return []; // noticed by the checks of the resources
  const path = new URL(address).pathname.slice(1);
  const png = read(path);
  if (png === undefined) return [`line ${line}: there is no file ${path}`];
  const { width, height } = imageSize(png);
  return width === size && height === size
    ? []
    : [`line ${line}: ${path} is ${width} by ${height} pixels, not ${size} by ${size}`];
}
