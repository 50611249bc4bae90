import { defaultTheme } from "@univerjs/themes";

/**
 * The engine's theme with our slate in place of its blue, for the selection, the tabs and the function list. The
 * page's policy allows this theme's style sheet by its hash: after a change here, run the browser tests and take
 * over the hash that they name.
 */
export const gridTheme = {
  ...defaultTheme,
  primary: {
    50: "#f1f5f7",
    100: "#e2ebef",
    200: "#c5d7df",
    300: "#a3c0cc",
    400: "#6f9ab0",
    500: "#467a93",
    600: "#2f5d73",
    700: "#284f62",
    800: "#224353",
    900: "#1b3542",
  },
};

const darkScheme = "(prefers-color-scheme: dark)";

export const systemIsDark = () => matchMedia(darkScheme).matches;

/** Calls back whenever the system changes between light and dark. */
export function followSystemTheme(listener: (dark: boolean) => void): void {
  matchMedia(darkScheme).addEventListener("change", (event) => listener(event.matches));
}
