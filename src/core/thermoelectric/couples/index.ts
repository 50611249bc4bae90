/** Every couple that has a published reference function, letter types first. */
import type { ReferenceFunction } from "../reference-function";
import { A } from "./A";
import { A2 } from "./A-2";
import { A3 } from "./A-3";
import { GoldPlatinum } from "./Au-Pt";
import { B } from "./B";
import { C } from "./C";
import { ChromelCopel } from "./Chromel-Copel";
import { CopperCopel } from "./Cu-Copel";
import { E } from "./E";
import { IridiumRhodiumIridium } from "./IrRh40-Ir";
import { J } from "./J";
import { K } from "./K";
import { N } from "./N";
import { ChromelGoldIron } from "./NiCr-AuFe0.07";
import { NickelMolybdenumNickelCobalt } from "./NiMo18-NiCo0.8";
import { PalladiumPlatinumGold } from "./PdPtAu-AuPd";
import { PlatinumPalladium } from "./Pt-Pd";
import { PlatinumMolybdenum } from "./PtMo5-PtMo0.1";
import { PlatinumRhodium40To20 } from "./PtRh40-PtRh20";
import { R } from "./R";
import { S } from "./S";
import { T } from "./T";
import { TungstenTungsten26Rhenium } from "./W-W26Re";

/** The letter types of IEC 60584-1:2013. */
export const letterTypes: readonly ReferenceFunction[] = [B, C, E, J, K, N, R, S, T, A];

/** Further couples, named by their conductors. */
export const furtherCouples: readonly ReferenceFunction[] = [
  A2,
  A3,
  ChromelCopel,
  CopperCopel,
  TungstenTungsten26Rhenium,
  PalladiumPlatinumGold,
  ChromelGoldIron,
  PlatinumMolybdenum,
  PlatinumRhodium40To20,
  NickelMolybdenumNickelCobalt,
  IridiumRhodiumIridium,
  GoldPlatinum,
  PlatinumPalladium,
];
