import {
  CellValueType,
  type ICellDataForSheetInterceptor,
  type Injector,
  InterceptorEffectEnum,
  type IStyleData,
} from "@univerjs/core";
import { FormulaDataModel, INTERCEPTOR_POINT, SheetInterceptorService } from "@univerjs/preset-sheets-core";
import { fittingPattern } from "./fitting-pattern";

/** Between the engine's own step that fetches a spilled value (100) and the one that formats numbers (10). */
const priority = 50;

/**
 * Formats what the engine leaves in full length. It gives the number format of a result to the first cell of a
 * spill alone, and cuts a number in the general format at the column's edge, where Excel fits its digits. Only
 * what is shown changes, only in cells without a format of their own, and only for the cells in view.
 */
export function showFittingDigits(injector: Injector): void {
  const model = injector.get(FormulaDataModel);
  injector.get(SheetInterceptorService).intercept(INTERCEPTOR_POINT.CELL_CONTENT, {
    priority,
    effect: InterceptorEffectEnum.Style,
    handler: (cell, location, next) => {
      if (cell?.t !== CellValueType.NUMBER || typeof cell.v !== "number") return next(cell);
      const { unitId, subUnitId, row, col, workbook } = location;
      const style = workbook.getStyles().get(cell.s) ?? undefined;
      if (style?.n) return next(cell);
      const spilled = model.getArrayFormulaCellData()[unitId]?.[subUnitId]?.[row]?.[col]?.s;
      const pattern =
        (typeof spilled === "object" ? spilled?.n?.pattern : undefined) ?? fittingPattern(cell.v);
      return next(pattern ? withFormat(cell, style, pattern) : cell);
    },
  });
}

const withFormat = (
  cell: ICellDataForSheetInterceptor,
  style: IStyleData | undefined,
  pattern: string,
): ICellDataForSheetInterceptor => ({ ...cell, s: { ...style, n: { pattern } } });
