/**
 * Entry of functions.js: tells the custom-functions runtime which function answers to
 * which id. Opened in an ordinary browser the task pane has no such runtime to tell.
 */
import * as worksheetFunctions from ".";

if (typeof CustomFunctions !== "undefined") {
  for (const [id, worksheetFunction] of Object.entries(worksheetFunctions)) {
    CustomFunctions.associate(id, worksheetFunction);
  }
}
