// What `npm run package` may be told on its command line.

import type { InstalledFrom } from "./with-pane";

export const USAGE = `npm run package -- --address https://host/path   the folder and the zip to put at that address
  --offline      with the parts of Office.js that Excel needs beside the pane, for a plant without internet
  --open-pane central | \\\\server\\folder
                 with copies of the samples that open the pane, for an add-in given out by the administrator or from a shared folder
  --localhost    allows an address on this machine, to try it out
  --help         this text`;

export interface PackageOptions {
  /** Without a slash at its end. */
  address: string;
  offline: boolean;
  /** Copies of the samples that open the pane are wanted, and this is where the add-in will be installed from. */
  openPane?: InstalledFrom;
}

/** Reads the command line; what it does not know it refuses with a sentence. */
export function readPackageOptions(
  words: readonly string[],
): PackageOptions | { help: true } | { refused: string } {
  let address: string | undefined;
  let installed: string | undefined;
  let [offline, localhost] = [false, false];
  for (let i = 0; i < words.length; i++) {
    const word = words[i] ?? "";
    if (word === "--help") return { help: true };
    if (word === "--offline") offline = true;
    else if (word === "--localhost") localhost = true;
    else if (word === "--address") address = words[++i];
    else if (word.startsWith("--address=")) address = word.slice("--address=".length);
    else if (word === "--open-pane") installed = words[++i] ?? "";
    else if (word.startsWith("--open-pane=")) installed = word.slice("--open-pane=".length);
    else
      return {
        refused: `"${word}" is not known here. Known are --address, --offline, --open-pane, --localhost and --help.`,
      };
  }
  if (address === undefined || address === "") {
    return { refused: "--address is missing: where will the files lie, such as https://host/beadline?" };
  }
  const refused = refusalOf(address, localhost);
  if (refused) return { refused };
  const options: PackageOptions = { address: new URL(address).href.replace(/\/$/, ""), offline };
  if (installed === undefined) return options;
  if (installed === "central") return { ...options, openPane: "central" };
  if (sharedFolder.test(installed)) return { ...options, openPane: { share: installed } };
  return {
    refused: `"${installed}" is no place that Excel has add-ins from: say --open-pane central, or the shared folder such as \\\\server\\folder.`,
  };
}

/** A server and at least one folder. Users' Excel must know it as a trusted catalogue by these very words. */
const sharedFolder = /^\\\\[\w.-]+(\\[^\\/:*?"<>|\s][^\\/:*?"<>|]*)+$/;

const thisMachine = /^(localhost|.+\.localhost|127(\.\d+){3}|0\.0\.0\.0|\[::1?\])$/i;

function refusalOf(address: string, localhost: boolean): string | undefined {
  if (!URL.canParse(address)) return `"${address}" is not a whole address such as https://host/path.`;
  const { protocol, username, password, search, hash, hostname, pathname } = new URL(address);
  if (protocol !== "https:")
    return `"${address}" must begin with https://: Excel loads no add-in without encryption.`;
  if (username || password)
    return "The address must hold no name and no password: everybody can read it in the manifest.";
  if (search || hash || /[?#]/.test(address))
    return `"${address}" must end with its path: nothing after a ? or a #.`;
  // Written as it will stand in the files: the parser would forgive blanks, backslashes and "..".
  if (!/^https:\/\/[^\s/\\]+(\/[\w.~%-]+)*\/?$/i.test(address) || /\/\.{1,2}(\/|$)/.test(address)) {
    return `"${address}" must be a plain path: letters, digits and - . _ ~ between single slashes.`;
  }
  if (/\/[^/]+\.(html?|xml|json|js)$/i.test(pathname)) {
    return `"${address}" must be the folder of the files, not one of them.`;
  }
  if (thisMachine.test(hostname) && !localhost) {
    return `${hostname} is this machine alone. Add --localhost if that is what you want.`;
  }
  return undefined;
}
