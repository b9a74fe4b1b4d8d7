import { describe, expect, it } from "vitest";
import { inputsFromAddress, inputsToAddress } from "#shared/calculators/address.ts";
import { calculators, runCalculator } from "#shared/calculators/registry.ts";

describe("inputsToAddress", () => {
  it("names a number inside a list by its dotted path and leaves out what is not given", () => {
    expect(inputsToAddress({ between: 500, ends: [{ kind: "square", angle: undefined }] })).toEqual([
      ["between", "500"],
      ["ends.0.kind", "square"],
    ]);
  });
});

describe("inputsFromAddress", () => {
  it.each(calculators.map((each) => [each.id, each] as const))(
    "gives back the example of %s as it went in",
    (id, { example, fields }) => {
      const read = inputsFromAddress(fields, inputsToAddress(example));
      const [there, back] = [runCalculator(id, example), runCalculator(id, read)];
      expect(back.ok).toBe(true);
      expect(back).toEqual(there);
    },
  );

  it("prefers the parts of a list over its count, whichever comes first", () => {
    const fields = calculators.find(({ id }) => id === "sheet-bend")?.fields ?? [];
    const parts = [
      ["flanges.0", "20"],
      ["flanges.1", "30"],
    ] as const;
    const wanted = { flanges: [20, 30] };
    expect(inputsFromAddress(fields, [["flanges", "2"], ...parts])).toEqual(wanted);
    expect(inputsFromAddress(fields, [...parts, ["flanges", "2"]])).toEqual(wanted);
  });

  it("leaves words where a number was wanted for the schema to refuse", () => {
    const fields = calculators.find(({ id }) => id === "saddle-cope")?.fields ?? [];
    expect(inputsFromAddress(fields, [["angle", "steep"]])).toEqual({ angle: "steep" });
  });

  it("takes a name that means something to JavaScript as a name and nothing more", () => {
    inputsFromAddress([], [["__proto__.polluted", "1"]]);
    expect(Object.prototype).not.toHaveProperty("polluted");
  });
});
