import { eachAgrees } from "./agrees";
import { eaSets } from "./ea-4-02";

eachAgrees(eaSets);
