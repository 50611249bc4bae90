import { eachAgrees } from "./agrees";
import { conversionSets } from "./conversions";

eachAgrees(conversionSets);
