// What must hold of package-lock.json: each package pinned by a digest, and none from an open line.

export interface LockEntry {
  readonly version?: string;
  readonly integrity?: string;
  readonly resolved?: string;
  readonly link?: boolean;
  /** Lies inside the archive of another package, under that one's digest. */
  readonly inBundle?: boolean;
}

/** What is wrong, in words; empty when nothing is. The key of the project itself is "". */
export function lockFileFaults(packages: Readonly<Record<string, LockEntry>>): string[] {
  return Object.entries(packages).flatMap(([path, { version, integrity, resolved, link, inBundle }]) => {
    if (path === "" || inBundle === true) return [];
    if (link === true) return [`${path} is a link to somewhere else`];
    const faults: string[] = [];
    if (version === undefined) faults.push(`${path} has no version`);
    if (!/^sha512-[A-Za-z0-9+/]{86}==$/.test(integrity ?? "")) faults.push(`${path} has no SHA-512 digest`);
    if (resolved !== undefined && !resolved.startsWith("https://"))
      faults.push(`${path} comes from ${resolved}`);
    return faults;
  });
}
