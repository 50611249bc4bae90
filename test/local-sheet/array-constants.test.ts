import { type ArrayValueObject, ValueObjectFactory } from "@univerjs/engine-formula";
import { expect, it } from "vitest";
import { readNumbersInArrayConstants } from "../../src/local-sheet/array-constants";

it("reads every number of an array constant as a number, and a quoted one as text", () => {
  const read = () => (ValueObjectFactory.create('{-0.4;-1.0,+2;1E3,"1.0"}') as ArrayValueObject).toValue();
  // When the engine reads them by itself, our correction can go.
  expect(read()).not.toEqual([[-0.4], [-1, 2], [1000, "1.0"]]);
  readNumbersInArrayConstants();
  expect(read()).toEqual([[-0.4], [-1, 2], [1000, "1.0"]]);
});
