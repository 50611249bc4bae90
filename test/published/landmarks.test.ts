import { eachAgrees } from "./agrees";
import { landmarkSets } from "./landmarks";

eachAgrees(landmarkSets);
