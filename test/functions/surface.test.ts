/**
 * The frozen public surface. Workbooks in the field hold these names and this order of arguments: a change here
 * is a deliberate break, and belongs in the changelog.
 */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import packageJson from "../../package.json";
import { loadBuiltFunctions } from "../../src/build/built-functions";
import metadata from "../../src/catalogue/functions.json";
import { version } from "../../src/functions/version";

const SURFACE: Readonly<Record<string, string>> = {
  TEMPERATURE: "emf, type, referenceTemperature, [unit]",
  EMF: "temperature, type, [referenceTemperature], [unit]",
  SEEBECK: "temperature, type, [unit]",
  EMFTABLE: "type, start, end, [step], [column], [unit]",
  TYPEINFO: "type, [metric], [unit]",
  TOITS90: "t68, [unit]",
  PRTEMPERATURE: "resistance, [r0], [unit]",
  PRTRESISTANCE: "temperature, [r0], [unit]",
  NTCTEMPERATURE: "resistance, coefficients, [unit]",
  REREFERENCE: "indicated, type, assumedReference, actualReference, [unit]",
  RETYPE: "indicated, setType, fittedType, referenceTemperature, [unit]",
  UNREVERSE: "indicated, type, crossedAt, referenceTemperature, [headTemperature], [unit]",
  LEADERROR: "temperature, type, lead, headTemperature, referenceTemperature, [unit]",
  RELEAD: "indicated, type, lead, headTemperature, referenceTemperature, [unit]",
  DIFFERENTIAL: "emf, type, baseTemperature, [pairs], [unit]",
  DIAGNOSE: "indicated, expected, type, referenceTemperature, [headTemperature], [column], [unit]",
  CORRECTION: "reading, points, values, [givenAs], [method], [pointsAre], [unit]",
  CORRECTED: "reading, points, values, [givenAs], [method], [pointsAre], [at], [unit]",
  CORRECTIONU: "reading, points, expandedUncertainties, [k], [drift], [unit]",
  DEVIATION: "emf, type, trueTemperature, referenceTemperature, [expressedIn], [unit]",
  ATNOMINAL: "emf, type, trueTemperature, nominal, [unit]",
  CALFIT: "temperatures, deviationsUv, order, [uncertainties], [throughZero], [metric], [unit]",
  CALTEMPERATURE: "emf, type, coefficients, low, high, referenceTemperature, [referenceBy], [unit]",
  CALEMF: "temperature, type, coefficients, low, high, [referenceTemperature], [referenceBy], [unit]",
  CALDRIFT: "points, firstValues, secondValues, firstDate, secondDate, [limits], [column], [unit]",
  TOLERANCE: "temperature, type, toleranceClass, [expressedIn], [unit]",
  CABLETOLERANCE: "cable, toleranceClass, [expressedIn], [temperature], [unit]",
  ACCEPTANCE: "limit, expandedUncertainty, [rule]",
  VERDICT: "error, limit, [expandedUncertainty], [rule], [lower]",
  CONFORMITY: "value, upper, standardUncertainty, [lower]",
  STATEMENT: "error, limit, expandedUncertainty, [rule], [k], [unit]",
  CLASSMET: "temperatures, errors, type, [standard], [unit]",
  CHECKTABLE:
    "reference, readings, type, toleranceClass, [expandedUncertainty], [rule], [names], [limits], [column], [unit]",
  ENSCORE: "value, expandedUncertainty, referenceValue, referenceUncertainty",
  TYPEA: "readings, [metric]",
  STANDARDU: "value, distribution, [divisor]",
  COMBINEDU: "uncertainties, [sensitivities], [correlations]",
  EFFECTIVEDOF: "uncertainties, degreesOfFreedom, [sensitivities]",
  COVERAGE: "degreesOfFreedom, [probability]",
  BUDGET: "lines, [probability], [metric]",
  TEMPERATUREU:
    "temperature, type, uEmfUv, uReference, referenceTemperature, [uOther], [inhomogeneity], [unit]",
  SIMULATEU:
    "emf, type, referenceTemperature, uEmfUv, uReference, [uOther], [trials], [seed], [metric], [unit]",
  REPORTVALUE: "value, expandedUncertainty, [digits]",
  TIMELINE: "times, [column]",
  FLAGS: "readings, low, high, [maxStep], [stuckCount], [spikeWidth]",
  DESPIKE: "readings, [halfWindow], [threshold]",
  RAMPRATE: "times, temperatures, [windowMinutes], [timeUnit]",
  TIMECONSTANT: "times, temperatures, [timeUnit], [metric]",
  UNLAG: "times, temperatures, timeConstant, [windowMinutes], [timeUnit]",
  SOAK: "times, readings, setpoint, tolerance, [corrections], [maxGap], [timeUnit], [metric]",
  SURVEY:
    "times, readings, setpoint, tolerance, [corrections], [names], [start], [end], [requiredMinutes], [maxGap], [timeUnit], [metric], [unit]",
  SURVEYSENSORS:
    "times, readings, setpoint, tolerance, [corrections], [names], [start], [end], [timeUnit], [column], [unit]",
  ENVELOPE: "readings, [corrections], [column]",
  SURVEYCLASS: "deviation, [unit]",
  SYSTEMCHECK: "indicated, testReading, sensorCorrection, instrumentCorrection",
  TIMEABOVE: "times, temperatures, threshold, [maxGap], [timeUnit]",
  LETHALITY:
    "times, temperatures, referenceTemperature, z, [threshold], [method], [maxGap], [timeUnit], [metric], [unit]",
  MEANKINETIC: "temperatures, [activationEnergy], [times], [timeUnit], [unit]",
  WORKING:
    "emf, type, referenceTemperature, [points], [values], [givenAs], [method], [pointsAre], [column], [unit]",
  PROVENANCE: "[metric]",
};

const declared = Object.fromEntries(
  metadata.functions.map(({ id, parameters }) => [
    id,
    parameters
      .map((parameter) => ("optional" in parameter ? `[${parameter.name}]` : parameter.name))
      .join(", "),
  ]),
);

describe("the public surface", () => {
  it("is exactly this", () => {
    expect(declared).toEqual(SURFACE);
  });

  it("is what functions.js associates", () => {
    const built = loadBuiltFunctions(readFileSync("dist/functions.js", "utf8"));
    expect([...built.keys()].sort()).toEqual(Object.keys(SURFACE).sort());
  });

  it("carries the version of the package", () => {
    expect(version).toBe(packageJson.version);
  });
});

describe("functions.json keeps the platform's limits", () => {
  it("lets errors into ranges and data types not", () => {
    expect(metadata).toMatchObject({ allowErrorForDataTypeAny: true });
    expect(metadata).not.toHaveProperty("allowCustomDataForDataTypeAny");
  });

  it.each(metadata.functions)("$id", ({ id, name, description, helpUrl, parameters, result }) => {
    expect(id).toBe(name);
    // No reference to a cell, 3 to 64 characters; dots would become underscores in a saved file.
    expect(id).toMatch(/^[A-Z][A-Z0-9]{2,63}$/);
    expect(id).not.toMatch(/^[A-Z]{1,3}\d+$/);
    expect(helpUrl).toBe(`https://localhost:3000/help.html#${id}`);
    for (const text of [description, ...parameters.map((parameter) => parameter.description)]) {
      expect(text.length).toBeGreaterThan(0);
      expect(text.length).toBeLessThanOrEqual(255);
      expect(text).not.toMatch(/\n|https?:/);
    }
    // Every argument arrives as a matrix: nothing is lifted cell by cell, and left out differs from blank.
    for (const parameter of parameters)
      expect(parameter).toMatchObject({ type: "any", dimensionality: "matrix" });
    expect(result.dimensionality).toBe("matrix");
  });
});
