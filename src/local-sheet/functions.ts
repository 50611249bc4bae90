import { BooleanNumber, type Injector } from "@univerjs/core";
import { BaseReferenceObject } from "@univerjs/engine-formula";
import {
  CELL_INVERTED_INDEX_CACHE,
  FunctionType,
  IDescriptionService,
  IFunctionService,
} from "@univerjs/preset-sheets-core";
import { functionsRuntime, type WorksheetFunction } from "../catalogue/functions-runtime";
import { readNumbersInArrayConstants } from "./array-constants";
import { keepBlankResults } from "./blank-results";
import { EngineFunction } from "./engine-function";
import { ErrorMessages } from "./error-messages";
import { type FunctionMetadata, readMetadata } from "./function-metadata";
import { offerAllFunctions } from "./offered-functions";
import type { ResultFormat } from "./result-format";
import { switchOffInvertedIndex } from "./spill-cache";

const namespace = "BEAD";

/** The built functions with their metadata, read from beside the page. */
export interface BuiltFunctions {
  metadata: FunctionMetadata[];
  associated: Map<string, WorksheetFunction>;
}

export async function loadBuiltFunctions(): Promise<BuiltFunctions> {
  const { associated, CustomFunctions } = functionsRuntime();
  Object.assign(globalThis, { CustomFunctions });
  const [metadata] = await Promise.all([readMetadata("functions.json"), loadScript("functions.js")]);
  return { metadata, associated };
}

function loadScript(address: string): Promise<void> {
  return new Promise((resolve, reject) => {
    const script = document.createElement("script");
    script.src = address;
    script.onload = () => resolve();
    script.onerror = () => reject(new Error(`${address} could not be loaded`));
    document.head.append(script);
  });
}

/** Makes the built functions known to the engine, with the words that its function list and its help show. */
export function registerFunctions(
  injector: Injector,
  { metadata, associated }: BuiltFunctions,
  formatOf: (id: string) => ResultFormat,
): ErrorMessages {
  readNumbersInArrayConstants();
  switchOffInvertedIndex(CELL_INVERTED_INDEX_CACHE);
  keepBlankResults(BaseReferenceObject.prototype);
  const messages = new ErrorMessages();
  const functions = metadata.map((each) => {
    const implementation = associated.get(each.id);
    if (!implementation) throw new Error(`functions.js associates no function ${each.id}`);
    return new EngineFunction(`${namespace}.${each.name}`, each, implementation, messages, formatOf(each.id));
  });
  injector.get(IFunctionService).registerExecutors(...functions);
  const descriptions = injector.get(IDescriptionService);
  descriptions.registerDescriptions(metadata.map(describe));
  offerAllFunctions(descriptions, namespace);
  return messages;
}

const describe = ({ name, description, parameters }: FunctionMetadata) => ({
  functionName: `${namespace}.${name}`,
  functionType: FunctionType.User,
  description,
  // The list under a half-typed name shows this one.
  abstract: description,
  functionParameter: parameters.map((parameter) => ({
    name: parameter.name,
    detail: parameter.description,
    example: "",
    require: parameter.optional ? BooleanNumber.FALSE : BooleanNumber.TRUE,
    repeat: BooleanNumber.FALSE,
  })),
});
