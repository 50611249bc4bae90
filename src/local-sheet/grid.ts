import { type IWorkbookData, LocaleType, LogLevel, Univer, UniverInstanceType } from "@univerjs/core";
import { FUniver } from "@univerjs/core/facade";
import { UniverSheetsCorePreset } from "@univerjs/preset-sheets-core";
import english from "@univerjs/preset-sheets-core/locales/en-US";
import "@univerjs/preset-sheets-core/lib/index.css";
import { growWithSelection } from "./grow";
import { followSystemTheme, gridTheme, systemIsDark } from "./theme";

export interface Grid {
  univer: Univer;
  api: FUniver;
}

/**
 * The grid engine with nothing but formula bar, grid and sheet tabs, holding one workbook. Calculation stays on
 * the main thread: a worker would need a second copy of the functions.
 */
export function createGrid(container: HTMLElement, workbook: IWorkbookData): Grid {
  const univer = new Univer({
    locale: LocaleType.EN_US,
    locales: { [LocaleType.EN_US]: english },
    logLevel: LogLevel.ERROR,
    theme: gridTheme,
    darkMode: systemIsDark(),
  });
  const { plugins } = UniverSheetsCorePreset({
    container,
    header: true,
    toolbar: false,
    formulaBar: true,
    footer: { sheetBar: true, menus: false, statisticBar: false, zoomSlider: false },
  });
  for (const plugin of plugins) {
    if (Array.isArray(plugin)) univer.registerPlugin(plugin[0], plugin[1]);
    else univer.registerPlugin(plugin);
  }
  const api = FUniver.newAPI(univer);
  univer.createUnit(UniverInstanceType.UNIVER_SHEET, workbook);
  growWithSelection(api);
  followSystemTheme((dark) => api.toggleDarkMode(dark));
  return { univer, api };
}

/** Puts another workbook in place of the open one, of which nothing is kept. */
export function openWorkbook({ univer, api }: Grid, workbook: IWorkbookData): void {
  const old = api.getActiveWorkbook()?.getId();
  // In this order, so that there is an open workbook at every moment.
  univer.createUnit(UniverInstanceType.UNIVER_SHEET, workbook);
  if (old !== undefined) api.disposeUnit(old);
  api.getFormula().executeCalculation();
}
