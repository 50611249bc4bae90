/**
 * `npm run contract`, a step of every release: freezes what the built version gives. Refuses when a result differs
 * from an earlier version's and "Results changed" of the changelog does not name its function, and when the version
 * has been released already.
 */
import { root } from "../sources";
import { freezeVersion } from "./freeze";

const outcome = freezeVersion(root);
if ("done" in outcome) console.log(outcome.done);
else {
  console.error(outcome.refused);
  process.exitCode = 1;
}
