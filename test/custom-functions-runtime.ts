/** Makes the functions' runtime global for tests, as the spreadsheet makes it global for them. */
import { functionsRuntime } from "../src/catalogue/functions-runtime";

Object.assign(globalThis, { CustomFunctions: functionsRuntime().CustomFunctions });
