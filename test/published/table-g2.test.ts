import { eachAgrees } from "./agrees";
import { tableG2Sets } from "./table-g2";

eachAgrees(tableG2Sets);
