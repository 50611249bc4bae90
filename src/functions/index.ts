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

// Judge
export { TOLERANCE } from "./judge/tolerance";
export { CABLETOLERANCE } from "./judge/cabletolerance";
export { ACCEPTANCE } from "./judge/acceptance";
export { VERDICT } from "./judge/verdict";
export { CONFORMITY } from "./judge/conformity";
export { STATEMENT } from "./judge/statement";
export { CLASSMET } from "./judge/classmet";
export { CHECKTABLE } from "./judge/checktable";
export { ENSCORE } from "./judge/enscore";

// Weigh
export { TYPEA } from "./weigh/typea";
export { STANDARDU } from "./weigh/standardu";
export { COMBINEDU } from "./weigh/combinedu";
export { EFFECTIVEDOF } from "./weigh/effectivedof";
export { COVERAGE } from "./weigh/coverage";
export { BUDGET } from "./weigh/budget";
export { TEMPERATUREU } from "./weigh/temperatureu";
export { SIMULATEU } from "./weigh/simulateu";
export { REPORTVALUE } from "./weigh/reportvalue";

// Screen
export { TIMELINE } from "./screen/timeline";
export { FLAGS } from "./screen/flags";
export { DESPIKE } from "./screen/despike";
export { RAMPRATE } from "./screen/ramprate";
export { TIMECONSTANT } from "./screen/timeconstant";
export { UNLAG } from "./screen/unlag";

// Survey
export { SOAK } from "./survey/soak";
export { SURVEY } from "./survey/survey";
export { SURVEYSENSORS } from "./survey/surveysensors";
export { ENVELOPE } from "./survey/envelope";
export { SURVEYCLASS } from "./survey/surveyclass";
export { SYSTEMCHECK } from "./survey/systemcheck";
export { TIMEABOVE } from "./survey/timeabove";
export { LETHALITY } from "./survey/lethality";
export { MEANKINETIC } from "./survey/meankinetic";

// Record
export { WORKING } from "./record/working";
export { PROVENANCE } from "./record/provenance";
