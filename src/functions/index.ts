/**
 * The public surface: every worksheet function under the name that workbooks hold, in
 * the order in which people are shown them.
 */
// biome-ignore-all assist/source/organizeImports: the order is the order of the catalogue

// Convert
export { TEMPERATURE } from "./convert/temperature";
export { EMF } from "./convert/emf";
export { SEEBECK } from "./convert/seebeck";
export { EMFTABLE } from "./convert/emftable";
export { TYPEINFO } from "./convert/typeinfo";
export { TOITS90 } from "./convert/toits90";

// Record
export { PROVENANCE } from "./record/provenance";
