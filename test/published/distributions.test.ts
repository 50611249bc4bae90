import { eachAgrees } from "./agrees";
import { distributionSets } from "./distributions";

eachAgrees(distributionSets);
