import { eachAgrees } from "./agrees";
import { calibrationSets } from "./calibration";

eachAgrees(calibrationSets);
