import type { Catalogue } from "../catalogue/catalogue";
import generated from "../catalogue/catalogue.json";

/** The generated catalogue: the only place from which our pages know a function's name. */
export const catalogue = generated as Catalogue;
