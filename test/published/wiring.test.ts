import { eachAgrees } from "./agrees";
import { wiringSets } from "./wiring";

eachAgrees(wiringSets);
