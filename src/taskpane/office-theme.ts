/** The pane's page in the colours of the Office around it, which need not be those of the system. */
export function followOfficeTheme(): void {
  applyOfficeTheme();
  // Excel tells of no change; the theme is read again when the pane gets the focus.
  window.addEventListener("focus", applyOfficeTheme);
}

function applyOfficeTheme(): void {
  const theme = Office.context.officeTheme as Office.OfficeTheme | undefined;
  const { style, dataset } = document.documentElement;
  const paper = theme && luminance(theme.bodyBackgroundColor);
  if (!theme || paper === undefined || matchMedia("(forced-colors: active)").matches) {
    delete dataset.theme;
    for (const name of ["--paper", "--surface", "--ink"]) style.removeProperty(name);
    return;
  }
  dataset.theme = paper < 0.4 ? "dark" : "light";
  style.setProperty("--paper", theme.bodyBackgroundColor);
  style.setProperty("--surface", theme.bodyBackgroundColor);
  style.setProperty("--ink", theme.bodyForegroundColor);
}

/** From 0, black, to 1, white; undefined for what is no colour of six digits. */
export function luminance(colour: string | undefined): number | undefined {
  const match = /^#?([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(colour ?? "");
  if (!match) return undefined;
  const [red, green, blue] = match.slice(1).map((part) => Number.parseInt(part, 16) / 255) as [
    number,
    number,
    number,
  ];
  return 0.2126 * red ** 2.2 + 0.7152 * green ** 2.2 + 0.0722 * blue ** 2.2;
}
