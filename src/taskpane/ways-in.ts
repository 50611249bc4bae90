import type { MountedPane } from "./shell";

/** What the manifest and shortcuts.json call by name. A test holds the names to both. */
export const ACTIONS = { showPane: "Find", explainCell: "Formula" } as const;

/** Answers to the cell's context menu and to the keyboard shortcut, where this Excel has them. */
export function openWaysIn(pane: MountedPane): void {
  for (const [name, view] of Object.entries(ACTIONS)) {
    Office.actions?.associate(name, async (event?: Office.AddinCommands.Event) => {
      try {
        await Office.addin.showAsTaskpane();
        await pane.open(view);
      } finally {
        event?.completed?.();
      }
    });
  }
}

/** From now on the functions load with this document, whoever opens it with the add-in installed. */
export async function loadWithDocument(): Promise<void> {
  try {
    await Office.addin.setStartupBehavior(Office.StartupBehavior.load);
  } catch {
    // An Excel that cannot do this loads the functions when the first of them is calculated.
  }
}
