import { eachAgrees } from "./agrees";
import { emfSets } from "./emf-tables";

eachAgrees(emfSets);
