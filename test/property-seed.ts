/**
 * Property tests draw the same cases in every run, so that a failure on one machine is a failure on all;
 * `SEED=7 npx vitest run --project unit test/properties` draws others.
 */
import fc from "fast-check";

fc.configureGlobal({ seed: Number(process.env.SEED ?? 20261201) });
