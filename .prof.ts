import "./test/custom-functions-runtime";
import catalogue from "./src/catalogue/catalogue.json";
import * as worksheet from "./src/functions";
import { wholeColumn } from "./test/properties/large-input";
const ids = process.argv[2]?.split(",");
const rowsList = (process.argv[3] ?? "1000,1000000").split(",").map(Number);
for (const one of (catalogue as any).functions) {
  if (ids && ids[0] && !ids.includes(one.id)) continue;
  const out: string[] = [];
  for (const rows of rowsList) {
    const given = wholeColumn(one, rows);
    const t = performance.now();
    const r = (worksheet as any)[one.id](...given);
    const ms = performance.now() - t;
    out.push(`${rows}: ${ms.toFixed(0)} ms ${(ms * 1000 / rows).toFixed(2)} us/row ${r.length === 1 && r[0].length===1 ? String(r[0][0]?.message ?? r[0][0]) : r.length}`);
  }
  console.log(one.category, one.id, out.join(" | "));
}
