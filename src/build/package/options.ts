// What `npm run package` may be told on its command line.

export const USAGE = `npm run package -- --address https://host/path   the folder and the zip to put at that address
  --offline      with the parts of Office.js that Excel needs beside the pane, for a plant without internet
  --localhost    allows an address on this machine, to try it out
  --help         this text`;

export interface PackageOptions {
  /** Without a slash at its end. */
  address: string;
  offline: boolean;
}

/** Reads the command line; what it does not know it refuses with a sentence. */
export function readPackageOptions(
  words: readonly string[],
): PackageOptions | { help: true } | { refused: string } {
  let address: string | undefined;
  let [offline, localhost] = [false, false];
  for (let i = 0; i < words.length; i++) {
    const word = words[i] ?? "";
    if (word === "--help") return { help: true };
    if (word === "--offline") offline = true;
    else if (word === "--localhost") localhost = true;
    else if (word === "--address") address = words[++i];
    else if (word.startsWith("--address=")) address = word.slice("--address=".length);
    else
      return {
        refused: `"${word}" is not known here. Known are --address, --offline, --localhost and --help.`,
      };
  }
  if (address === undefined || address === "") {
    return { refused: "--address is missing: where will the files lie, such as https://host/beadline?" };
  }
  const refused = refusalOf(address, localhost);
  return refused ? { refused } : { address: new URL(address).href.replace(/\/$/, ""), offline };
}

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
