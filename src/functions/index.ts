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

// Compensate
export { PRTEMPERATURE } from "./compensate/prtemperature";
export { PRTRESISTANCE } from "./compensate/prtresistance";
export { NTCTEMPERATURE } from "./compensate/ntctemperature";
export { REREFERENCE } from "./compensate/rereference";
export { RETYPE } from "./compensate/retype";
export { UNREVERSE } from "./compensate/unreverse";
export { LEADERROR } from "./compensate/leaderror";
export { RELEAD } from "./compensate/relead";
export { DIFFERENTIAL } from "./compensate/differential";
export { DIAGNOSE } from "./compensate/diagnose";

// Correct
export { CORRECTION } from "./correct/correction";
export { CORRECTED } from "./correct/corrected";
export { CORRECTIONU } from "./correct/correctionu";
export { DEVIATION } from "./correct/deviation";
export { ATNOMINAL } from "./correct/atnominal";
export { CALFIT } from "./correct/calfit";
export { CALTEMPERATURE } from "./correct/caltemperature";
export { CALEMF } from "./correct/calemf";
export { CALDRIFT } from "./correct/caldrift";

// Record
export { PROVENANCE } from "./record/provenance";
