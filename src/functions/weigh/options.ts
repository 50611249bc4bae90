/** Arguments that several functions of this family share. */
import { TWO_SIGMA } from "../../core";
import { once, orElse } from "../arguments";
import { number } from "../kinds/numbers";

export const probability = orElse(once(number), TWO_SIGMA, "0.9545");
