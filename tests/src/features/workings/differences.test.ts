import { describe, expect, it } from "vitest";
import { findCalculator, runCalculator } from "#shared/calculators/registry.ts";
import { inputDifferences, resultDifferences } from "#src/features/workings/differences.ts";

function sum(id: string, changes: Record<string, unknown> = {}) {
  const definition = findCalculator(id);
  if (!definition) throw new Error(`there is no ${id}`);
  const run = runCalculator(id, { ...definition.example, ...changes });
  if (!run.ok) throw new Error(`${id} does not work`);
  return { definition, numbers: run.value };
}

describe("inputDifferences", () => {
  it("names only what differs, with the change in the person's unit", () => {
    const { definition, numbers } = sum("saddle-cope");
    const other = sum("saddle-cope", { branchOd: 31.75, angle: 75 }).numbers;
    const label = "Branch outside diameter";
    const rows = inputDifferences(definition, numbers, other, "inch");
    expect(rows).toMatchObject([
      { label, unit: "in", first: "1.5", second: "1.25", change: "−0.25" },
      { label: "Angle between the axes", unit: "°", first: "60", second: "75", change: "+15" },
    ]);
  });

  it("tells an item that one of the two lists does not have", () => {
    const { definition, numbers } = sum("sheet-bend", { flanges: [20, 30], angles: [90] });
    const other = sum("sheet-bend", { flanges: [20, 30, 40], angles: [90, 90] }).numbers;
    const rows = inputDifferences(definition, numbers, other, "mm");
    expect(rows[0]).toMatchObject({ label: "Flange (3)", first: "–", second: "40", change: "" });
  });

  it("is empty for a sum and itself", () => {
    const { definition, numbers } = sum("wishbone-travel");
    expect(inputDifferences(definition, numbers, numbers, "mm")).toEqual([]);
  });
});

describe("resultDifferences", () => {
  it("leaves out what looks the same at the decimals shown", () => {
    const { definition, numbers } = sum("saddle-cope");
    const other = { ...numbers.results, deepest: 30.194, heelDepth: 25.1946 };
    const rows = resultDifferences(definition.resultFields, numbers.results, other, "mm");
    expect(rows).toMatchObject([{ name: "result deepest", first: "25.2", second: "30.2", change: "+5.0" }]);
  });
});
