/**
 * Entry of functions.js: tells the custom-functions runtime which function answers to
 * which id, and publishes the same functions to the page. In Excel's shared runtime the
 * pane is that page, so it can show live results; in an ordinary browser there is no
 * runtime to tell.
 */
import * as worksheetFunctions from ".";

if (typeof CustomFunctions !== "undefined") {
  for (const [id, worksheetFunction] of Object.entries(worksheetFunctions)) {
    CustomFunctions.associate(id, worksheetFunction);
  }
}

Object.defineProperty(globalThis, "BeadlineFunctions", { value: Object.freeze({ ...worksheetFunctions }) });
