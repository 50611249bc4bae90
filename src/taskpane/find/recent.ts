const KEY = "beadline-recent";
const KEPT = 5;

/** The functions used last, by id. They stay in this browser; where it keeps nothing, there are none. */
export function recentIds(): string[] {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(KEY) ?? "[]");
    return Array.isArray(kept) ? kept.filter((id) => typeof id === "string") : [];
  } catch {
    return [];
  }
}

export function rememberUse(id: string): void {
  try {
    localStorage.setItem(
      KEY,
      JSON.stringify([id, ...recentIds().filter((each) => each !== id)].slice(0, KEPT)),
    );
  } catch {
    // A browser that keeps nothing is no fault: the list then stays as it is.
  }
}
