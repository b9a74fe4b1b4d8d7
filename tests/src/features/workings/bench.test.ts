import { describe, expect, it } from "vitest";
import { inputsToAddress } from "#shared/calculators/address.ts";
import { calculators, findCalculator, runCalculator } from "#shared/calculators/registry.ts";
import { workArithmetic } from "#src/features/workings/arithmetic.ts";
import { findCalculatorsBy } from "#src/features/workings/find-calculators.ts";
import { typedFrom, workTyped } from "#src/features/workings/sum.ts";
import { readSumQuery, sumQuery } from "#src/features/workings/sum-link.ts";
import { withItem, withoutItem } from "#src/features/workings/typed-lists.ts";
import { type NumberField, readTypedNumber, understood } from "#src/features/workings/typed-number.ts";

function definitionOf(id: string) {
  const found = findCalculator(id);
  if (!found) throw new Error(`no ${id}`);
  return found;
}

const cope = definitionOf("saddle-cope");
const branchOd = cope.fields.find(({ name }) => name === "branchOd") as NumberField;

describe("workArithmetic", () => {
  it.each([
    ["48.3/2", 24.15],
    ["48,3/2", 24.15],
    ["2*(25+3)", 56],
    ["1 1/4 + 3/8", 1.625],
    ["-3 − 2", -5],
    ["3 × 4", 12],
  ])("works %s to %d", (text, value) => {
    expect(workArithmetic(text)).toBeCloseTo(value, 12);
  });

  it.each(["", "1/0", "a+1", "alert(1)", "[1]", "1;2", "'1'", "2**", "1 2", "this", "1<2"])(
    "does not take %j for a sum",
    (text) => {
      expect(workArithmetic(text)).toBeUndefined();
    },
  );
});

describe("readTypedNumber", () => {
  it("takes a unit that is typed before the person's own, after a sum too", () => {
    for (const [text, units] of [
      ["1 1/2 in", "mm"],
      ["76.2/2 mm", "inch"],
    ] as const) {
      expect(readTypedNumber(branchOd, text, units)).toMatchObject({ value: expect.closeTo(38.1, 9) });
    }
    expect(readTypedNumber(branchOd, "38 kg", "mm")).toMatchObject({ ok: false });
  });
});

describe("understood", () => {
  it("says what a sum came to and is silent at a plain number", () => {
    expect(understood(branchOd, "48.3/2", "mm")).toBe("= 24.15 mm");
    expect(understood(branchOd, "1 1/2", "inch")).toBe("= 1.5 in (38.10 mm)");
    expect(understood(branchOd, "38.1", "mm")).toBeUndefined();
    expect(understood(branchOd, "48.3/", "mm")).toBeUndefined();
  });
});

describe("workTyped", () => {
  it.each(calculators.map(({ id }) => id))("works the example of %s from what its form shows", (id) => {
    const definition = definitionOf(id);
    const run = runCalculator(id, definition.example);
    if (!run.ok) throw new Error(run.issue.message);
    const typed = typedFrom(definition, run.value.inputs, "mm");
    expect(workTyped(definition, typed, "mm", run.value.inputs)).toEqual(run);
  });

  it("names the very box inside a list that is at fault", () => {
    const definition = definitionOf("sheet-bend");
    const typed = { ...typedFrom(definition, { ...definition.example }, "mm"), "flanges.1": "wide" };
    expect(workTyped(definition, typed, "mm", {})).toMatchObject({ issue: { field: "flanges.1" } });
  });

  it("leaves out a group that is not switched on", () => {
    const definition = definitionOf("spring-ride");
    const typed = { ...typedFrom(definition, { ...definition.example }, "mm"), coil: "" };
    const worked = workTyped(definition, typed, "mm", {});
    expect(worked.ok && worked.value.inputs.coil).toBeUndefined();
    expect(worked.ok).toBe(true);
  });
});

describe("withItem and withoutItem", () => {
  const field = definitionOf("sheet-bend").fields.find(({ name }) => name === "flanges");
  if (field?.kind !== "list") throw new Error("flanges are no list");
  const typed = { flanges: "2", "flanges.0": "20", "flanges.1": "30", thickness: "2" };

  it("adds an item like the last", () => {
    expect(withItem(typed, field, "flanges", "mm")).toEqual({ ...typed, flanges: "3", "flanges.2": "30" });
  });

  it("takes one out and moves the rest up", () => {
    expect(withoutItem(typed, "flanges", 0)).toEqual({ flanges: "1", "flanges.0": "30", thickness: "2" });
  });
});

describe("readSumQuery", () => {
  it.each(calculators.map(({ id }) => id))("carries the example of %s through a link", (id) => {
    const definition = definitionOf(id);
    const run = runCalculator(id, definition.example);
    if (!run.ok) throw new Error(run.issue.message);
    const link = readSumQuery(definition, new URLSearchParams(sumQuery(run.value.inputs)));
    const back = link && workTyped(definition, link.typed, link.units, {});
    if (!back?.ok) throw new Error(`${id}: ${back?.issue.field} ${back?.issue.message}`);
    expect(inputsToAddress(back.value.results)).toEqual(inputsToAddress(run.value.results));
  });

  it("is null for an address that says nothing of this sum", () => {
    expect(readSumQuery(cope, new URLSearchParams("utm=1"))).toBeNull();
  });

  it("reads a form sent in inches", () => {
    const link = readSumQuery(cope, new URLSearchParams("branchOd=1+1%2F2&units=inch"));
    expect(link).toMatchObject({ units: "inch", typed: { branchOd: "1 1/2", angle: "" } });
  });
});

describe("findCalculatorsBy", () => {
  it.each([
    ["notch", "saddle-cope"],
    ["fishmouth", "saddle-cope"],
    ["tapping drill", "tap-drill"],
    ["bump steer", "wishbone-travel"],
  ])("finds by %s first", (typed, id) => {
    expect(findCalculatorsBy(calculators, typed)[0]?.id).toBe(id);
  });

  it("finds all for nothing typed and none for nonsense", () => {
    expect(findCalculatorsBy(calculators, " ")).toBe(calculators);
    expect(findCalculatorsBy(calculators, "marmalade")).toEqual([]);
  });
});
