import { eachAgrees } from "./agrees";
import { thermistorSets } from "./thermistor";

eachAgrees(thermistorSets);
